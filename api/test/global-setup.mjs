import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { startPostgres } from '../scripts/postgres/server.mjs';

/** A PostgreSQL of this run's own, thrown away at its end: its speed comes from not caring about a power cut. */
export default async function globalSetup() {
  if (process.env.TEST_DATABASE_URL) return;
  const dataFolder = fs.mkdtempSync(path.join(os.tmpdir(), 'harkmoor-test-'));
  fs.chmodSync(dataFolder, 0o755);
  const settings = { fsync: 'off', synchronous_commit: 'off', full_page_writes: 'off', max_connections: 200 };
  const postgres = await startPostgres({ dataFolder, settings, throwAway: true });
  process.env.TEST_DATABASE_URL = postgres.url;
  globalThis.harkmoorTestPostgres = postgres;
}
