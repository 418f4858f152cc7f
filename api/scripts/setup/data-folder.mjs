import { randomBytes } from 'node:crypto';
import fs from 'node:fs';
import path from 'node:path';
import { PlainFailure } from './plain-failure.mjs';
import { birthOf, until } from './processes.mjs';

const LEFTOVERS_MAY_END_MS = 20_000;

/** The data folder, as an absolute path: HARKMOOR_DATA, or .data in the clone. It is made when missing. */
export function openDataFolder(root) {
  const folder = path.resolve(root, process.env.HARKMOOR_DATA || '.data');
  fs.mkdirSync(folder, { recursive: true });
  return folder;
}

/** The key that signs access tokens: made at the first start, readable by its owner alone. */
export function signingSecret(dataFolder) {
  const file = path.join(dataFolder, 'jwt-secret');
  if (!fs.existsSync(file)) fs.writeFileSync(file, randomBytes(32).toString('base64url'), { mode: 0o600 });
  return fs.readFileSync(file, 'utf8').trim();
}

/**
 * Claims a data folder for this process: two starts on one folder would share a database. Fails with a sentence when
 * another start holds it. What a killed start left ends by itself; this waits for it, and ends what hangs.
 * Returns { note(name, pid), setAddress(url), release() }.
 */
export async function claimDataFolder(dataFolder) {
  const file = path.join(dataFolder, 'running.json');
  const earlier = readClaim(file);
  if (earlier && isSame(earlier.script)) {
    const where = earlier.address ? ` at ${earlier.address}` : '';
    throw new PlainFailure(
      `Harkmoor already runs from ${dataFolder}${where} (process ${earlier.script.pid}): stop it first, or set HARKMOOR_DATA and PORT for a second one.`,
    );
  }
  if (earlier) await endLeftovers(Object.values(earlier.children));
  const claim = { script: identityOf(process.pid), children: {} };
  const write = () => fs.writeFileSync(file, JSON.stringify(claim));
  write();
  return {
    note(name, pid) {
      claim.children[name] = identityOf(pid);
      write();
    },
    setAddress(address) {
      claim.address = address;
      write();
    },
    release: async () => fs.rmSync(file, { force: true }),
  };
}

function readClaim(file) {
  try {
    return JSON.parse(fs.readFileSync(file, 'utf8'));
  } catch {
    return null; // none, or one that was cut off in writing: its process is gone
  }
}

function identityOf(pid) {
  return { pid, birth: birthOf(pid) };
}

function isSame({ pid, birth }) {
  return birth !== null && birthOf(pid) === birth;
}

async function endLeftovers(children) {
  const ended = () => !children.some(isSame);
  if (ended()) return;
  console.log('Waiting for the parts of an earlier start to end …');
  if (await until(ended, LEFTOVERS_MAY_END_MS)) return;
  for (const child of children.filter(isSame)) process.kill(child.pid, 'SIGKILL');
  await until(ended, LEFTOVERS_MAY_END_MS);
}
