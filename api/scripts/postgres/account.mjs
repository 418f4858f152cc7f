import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
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
 * /var/lib/harkmoor-HASH, the same one at each start.
 */
export function clusterHome(dataFolder, account) {
  fs.mkdirSync(dataFolder, { recursive: true });
  if (account.uid === undefined) return path.join(dataFolder, 'postgres');
  if (spawnSync('test', ['-x', dataFolder], account).status === 0) return path.join(dataFolder, 'postgres');
  const hash = createHash('sha256').update(path.resolve(dataFolder)).digest('hex').slice(0, 8);
  return `/var/lib/harkmoor-${hash}`;
}
