import fs from 'node:fs';
import path from 'node:path';
import { installDebianPackage } from '../setup/debian-package.mjs';
import { PlainFailure } from '../setup/plain-failure.mjs';
import { outputOf } from '../setup/processes.mjs';

const DEBIAN_LIB = '/usr/lib/postgresql';

/** The folders that hold initdb and postgres, the preferred first: PG_BIN, Debian's (newest first), those on the PATH. */
export function postgresFolders() {
  const debian = fs.existsSync(DEBIAN_LIB)
    ? fs
        .readdirSync(DEBIAN_LIB)
        .sort((a, b) => Number(b) - Number(a))
        .map((version) => `${DEBIAN_LIB}/${version}/bin`)
    : [];
  const candidates = [process.env.PG_BIN, ...debian, ...(process.env.PATH ?? '').split(':')];
  return candidates.filter(
    (dir) => dir && ['initdb', 'postgres', 'psql'].every((name) => fs.existsSync(path.join(dir, name))),
  );
}

/** The folder of PostgreSQL's programs; installs Debian's package as root when there is none. */
export function ensurePostgres() {
  if (postgresFolders().length === 0) {
    installDebianPackage(
      'postgresql',
      'PostgreSQL is missing: install it (on Debian: apt-get install postgresql), or set PG_BIN to the folder of its initdb, then run this again.',
    );
  }
  const [folder] = postgresFolders();
  if (!folder)
    throw new PlainFailure(
      'PostgreSQL was installed, but its initdb was not found: set PG_BIN to its folder.',
    );
  return folder;
}

/** The folder whose programs can open a cluster: one of the same major version as the data. */
export function postgresFor(clusterFolder) {
  const preferred = ensurePostgres();
  const versionFile = path.join(clusterFolder, 'PG_VERSION');
  if (!fs.existsSync(versionFile)) return preferred;
  const major = fs.readFileSync(versionFile, 'utf8').trim();
  const fitting = postgresFolders().find((dir) => majorOf(dir) === major);
  if (fitting) return fitting;
  throw new PlainFailure(
    `The data in ${clusterFolder} was made by PostgreSQL ${major}, which is not installed: install that version, or set HARKMOOR_DATA to another folder.`,
  );
}

function majorOf(dir) {
  return /(\d+)/.exec(outputOf(path.join(dir, 'postgres'), ['--version'], { cwd: '/' }))?.[1];
}
