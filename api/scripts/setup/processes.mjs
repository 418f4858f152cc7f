import { spawn, spawnSync } from 'node:child_process';
import fs from 'node:fs';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { PlainFailure } from './plain-failure.mjs';

const TETHER = path.join(import.meta.dirname, 'tether.mjs');

/**
 * Starts a Node script that ends by itself when this process is gone: it gets an IPC channel and must end on 'disconnect'.
 * It has a session of its own, so Ctrl-C in a terminal reaches only the script that was called, which ends the rest in order.
 * `child.done` resolves to the exit code (1 after a signal), and never rejects.
 */
export function startScript(
  file,
  args = [],
  { env = {}, folder, output = 'inherit', nodeOptions = [] } = {},
) {
  const stdio = ['ignore', output, output === 'pipe' ? 'inherit' : output, 'ipc'];
  const child = spawn(process.execPath, [...nodeOptions, file, ...args], {
    stdio,
    detached: true,
    cwd: folder,
    env: { ...process.env, ...env },
  });
  child.done = new Promise((resolve) => {
    child.once('error', (error) => (console.error(String(error)), resolve(1)));
    child.once('exit', (code) => resolve(code ?? 1));
  });
  return child;
}

/** Starts any command in the same way, through a small process that ends the command's whole group. */
export function startCommand(command, args, options = {}) {
  return startScript(TETHER, [command, ...args], options);
}

/** Asks a child to end, waits, and forces it after `limitMs`. */
export async function endChild(child, limitMs = 15_000) {
  if (child.exitCode !== null || child.signalCode !== null) return;
  child.kill('SIGTERM');
  const ended = await Promise.race([child.done.then(() => true), sleep(limitMs, false, { ref: false })]);
  if (!ended) child.kill('SIGKILL');
  await child.done;
}

/** Runs a short command to its end and returns what it printed; throws with its output when it fails. */
export function outputOf(command, args, options = {}) {
  const result = spawnSync(command, args, { encoding: 'utf8', ...options });
  if (result.error) throw result.error;
  if (result.status !== 0) {
    const said = `${result.stdout ?? ''}${result.stderr ?? ''}`.trim();
    throw new PlainFailure(
      `${path.basename(command)} ended with ${result.status ?? result.signal}.\n${said}`,
    );
  }
  return (result.stdout ?? '').trim();
}

export function isAlive(pid) {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    return error.code === 'EPERM';
  }
}

/** When a process began, as text, or null when there is none: tells a process from a later one with the same number. */
export function birthOf(pid) {
  if (!isAlive(pid)) return null;
  try {
    const stat = fs.readFileSync(`/proc/${pid}/stat`, 'utf8');
    const [state, ...rest] = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    return state === 'Z' ? null : rest[18]; // the 22nd field of proc(5): start time in clock ticks
  } catch {
    const { status, stdout } = spawnSync('ps', ['-o', 'lstart=', '-p', String(pid)], { encoding: 'utf8' });
    return status === 0 ? stdout.trim() : null;
  }
}

/** Waits until `isTrue()` holds; resolves to whether it did within `limitMs`. */
export async function until(isTrue, limitMs, stepMs = 100) {
  for (const endMs = Date.now() + limitMs; Date.now() < endMs; await sleep(stepMs))
    if (await isTrue()) return true;
  return isTrue();
}
