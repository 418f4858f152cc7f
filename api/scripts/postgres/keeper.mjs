// Keeps one PostgreSQL server for the script that started this process, and stops it in order when that script is gone.
// PostgreSQL knows no IPC channel, so this small process holds it in its stead.
import { spawn, spawnSync } from 'node:child_process';
import fs from 'node:fs';
import path from 'node:path';
import { freePort, isPortFree } from '../setup/ports.mjs';
import { isAlive, until } from '../setup/processes.mjs';

const SESSIONS_MAY_END_MS = 4_000;
const START_LIMIT_MS = 60_000;
const STOP_LIMIT_MS = 60_000;

const task = JSON.parse(process.env.HARKMOOR_KEEPER);
const pidFile = path.join(task.cluster, 'postmaster.pid');
const logPath = path.join(task.home, 'log');
let stopping = false;
let ownServer = null;

process.on('disconnect', () => void stop());
for (const signal of ['SIGTERM', 'SIGINT', 'SIGHUP']) process.on(signal, () => void stop());

try {
  const port = runningPort() ?? (await startServer());
  void watch();
  if (process.connected) process.send({ port });
  else await stop();
} catch (error) {
  removeThrowAway();
  if (process.connected) process.send({ failure: error.message }, () => process.exit(1));
  else process.exit(1);
}

/** The first lines of postmaster.pid: pid, data folder, start, port; null when no server holds the cluster. */
function serverLines() {
  try {
    const lines = fs.readFileSync(pidFile, 'utf8').split('\n');
    return isPostgres(Number(lines[0])) ? lines : null;
  } catch {
    return null;
  }
}

/** A pid file may outlive a power cut, and its number may belong to another program since. */
function isPostgres(pid) {
  if (!isAlive(pid)) return false;
  try {
    return fs.readFileSync(`/proc/${pid}/comm`, 'utf8').startsWith('postgres');
  } catch {
    return true; // no /proc here: believe the file
  }
}

/** The port of a server that a killed start left running, when it answers. */
function runningPort() {
  const lines = serverLines();
  return lines && isReady(Number(lines[3])) ? Number(lines[3]) : null;
}

function isReady(port) {
  const args = ['-q', '-h', '127.0.0.1', '-p', String(port)];
  return spawnSync(path.join(task.bin, 'pg_isready'), args, task.account).status === 0;
}

async function startServer() {
  if (serverLines()) await until(() => serverLines() === null, STOP_LIMIT_MS); // one that is just ending
  if (!serverLines()) fs.rmSync(pidFile, { force: true });
  rotateLog();
  for (let attempt = 1; ; attempt += 1) {
    const port = attempt === 1 && (await isPortFree(task.port)) ? task.port : await freePort();
    const logFrom = fs.existsSync(logPath) ? fs.statSync(logPath).size : 0;
    if (await isUp(spawnServer(port), port)) return port;
    const said = fs.readFileSync(logPath, 'utf8').slice(logFrom);
    // somebody took the port between the look and the start
    if (attempt < 3 && /could not bind|Address already in use/.test(said)) continue;
    throw new Error(`PostgreSQL did not start:\n${said.slice(-2_000)}`);
  }
}

function spawnServer(port) {
  const log = fs.openSync(logPath, 'a', 0o600);
  const settings = { listen_addresses: '127.0.0.1', port, unix_socket_directories: '', ...task.settings };
  const args = Object.entries(settings).flatMap(([name, value]) => ['-c', `${name}=${value}`]);
  const server = spawn(path.join(task.bin, 'postgres'), ['-D', task.cluster, ...args], {
    ...task.account,
    detached: true,
    stdio: ['ignore', log, log],
  });
  server.once('error', (error) => fs.appendFileSync(logPath, `${error.message}\n`));
  fs.closeSync(log);
  ownServer = server;
  return server;
}

async function isUp(server, port) {
  await until(() => hasEnded(server) || isReady(port), START_LIMIT_MS, 50);
  return !hasEnded(server) && isReady(port);
}

function hasEnded(server) {
  return (
    server === null || server.pid === undefined || server.exitCode !== null || server.signalCode !== null
  );
}

/** Ends with an error when the server ends on its own, so that the script that needs it hears of it. */
async function watch() {
  while (serverLines()) await until(() => serverLines() === null, 1_000, 500);
  if (!stopping) process.exit(1);
}

/** Lets open sessions end (SIGTERM), then ends them (SIGINT: a clean shut-down with a checkpoint), at last by force. */
async function stop() {
  if (stopping) return;
  stopping = true;
  for (const [signal, limitMs] of [
    ['SIGTERM', SESSIONS_MAY_END_MS],
    ['SIGINT', STOP_LIMIT_MS],
    ['SIGQUIT', STOP_LIMIT_MS],
  ]) {
    // a server that is only just starting has not written its file yet
    const pid = Number(serverLines()?.[0] ?? (hasEnded(ownServer) ? 0 : ownServer.pid));
    if (!pid) break;
    process.kill(pid, signal);
    if (await until(() => serverLines() === null && hasEnded(ownServer), limitMs, 30)) break;
  }
  removeThrowAway();
  process.exit(0);
}

function removeThrowAway() {
  for (const place of task.remove) fs.rmSync(place, { recursive: true, force: true });
}

function rotateLog() {
  if (fs.existsSync(logPath) && fs.statSync(logPath).size > 10_000_000)
    fs.renameSync(logPath, `${logPath}.old`);
}
