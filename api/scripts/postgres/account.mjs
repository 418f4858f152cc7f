import { spawnSync } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import fs from 'node:fs';
import path from 'node:path';
import { outputOf } from '../setup/processes.mjs';

const isRoot = process.getuid?.() === 0;

/**
 * Spawn options for PostgreSQL's programs: postgres refuses to run as root, so there they get the uid and gid of the
 * `postgres` user that Debian's package makes. The working directory is one that this user may read.
 */
export function postgresAccount() {
  const account = { cwd: '/', env: { PATH: process.env.PATH, LC_ALL: 'C.UTF-8' } };
  if (!isRoot) return account;
  return {
    ...account,
    uid: Number(outputOf('id', ['-u', 'postgres'])),
    gid: Number(outputOf('id', ['-g', 'postgres'])),
  };
}

/** Gives a file or folder to the account that postgres runs as. */
export function giveTo(account, place) {
  if (account.uid !== undefined) fs.chownSync(place, account.uid, account.gid);
}

/**
 * The folder for a cluster: inside the data folder, or, when postgres may not pass there (a clone below /root),
 * /var/lib/harkmoor-HASH. A file in the data folder keeps that place, so that a new data folder gets a new cluster.
 */
export function clusterHome(dataFolder, account) {
  fs.mkdirSync(dataFolder, { recursive: true });
  const mayPass = account.uid === undefined || spawnSync('test', ['-x', dataFolder], account).status === 0;
  if (mayPass) return path.join(dataFolder, 'postgres');
  const note = path.join(dataFolder, 'postgres-place');
  if (!fs.existsSync(note)) fs.writeFileSync(note, `/var/lib/harkmoor-${randomBytes(4).toString('hex')}`);
  return fs.readFileSync(note, 'utf8').trim();
}
