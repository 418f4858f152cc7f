import { randomBytes } from 'node:crypto';
import fs from 'node:fs';
import path from 'node:path';
import { freePort } from '../setup/ports.mjs';
import { PlainFailure } from '../setup/plain-failure.mjs';
import { outputOf } from '../setup/processes.mjs';
import { clusterHome, giveTo, postgresAccount } from './account.mjs';
import { ensurePostgres, postgresFor } from './binaries.mjs';

/**
 * Opens the project's own cluster below a data folder, and makes it at the first time. It is reached by password on the
 * loopback address alone. Nothing here touches a cluster of the system.
 * Returns { bin, home, cluster, account, connection: { port, password } }; the server is not started.
 */
export async function openCluster(dataFolder) {
  ensurePostgres(); // installing it also makes the account
  const account = postgresAccount();
  const home = clusterHome(dataFolder, account);
  const cluster = path.join(home, 'cluster');
  const bin = postgresFor(cluster);
  if (!fs.existsSync(cluster)) await makeCluster({ bin, home, cluster, account });
  return { bin, home, cluster, account, connection: readConnection(home) };
}

/** Keeps the port and the password of a cluster in its 0700 folder. */
export function writeConnection(home, connection) {
  const file = path.join(home, 'connection.json');
  fs.writeFileSync(`${file}.new`, JSON.stringify(connection), { mode: 0o600 });
  fs.renameSync(`${file}.new`, file);
}

export function readConnection(home) {
  try {
    return JSON.parse(fs.readFileSync(path.join(home, 'connection.json'), 'utf8'));
  } catch {
    throw new PlainFailure(
      `${home} holds a database, but its connection.json cannot be read: put the file back, or set HARKMOOR_DATA to another folder.`,
    );
  }
}

async function makeCluster({ bin, home, cluster, account }) {
  console.log('Making a database cluster …');
  fs.mkdirSync(home, { recursive: true, mode: 0o700 });
  giveTo(account, home);
  const connection = { port: await freePort(), password: randomBytes(18).toString('base64url') };
  writeConnection(home, connection);
  const passwordFile = path.join(home, 'password');
  fs.writeFileSync(passwordFile, connection.password, { mode: 0o600 });
  giveTo(account, passwordFile);
  // made beside its place and renamed when whole: an initdb that was cut off leaves nothing that looks like a cluster
  const unfinished = `${cluster}.new`;
  fs.rmSync(unfinished, { recursive: true, force: true });
  const access = ['-U', 'harkmoor', '-A', 'scram-sha-256', '--pwfile', passwordFile];
  outputOf(
    path.join(bin, 'initdb'),
    ['-D', unfinished, ...access, '-E', 'UTF8', '--locale=C.UTF-8'],
    account,
  );
  fs.rmSync(passwordFile);
  fs.renameSync(unfinished, cluster);
}
