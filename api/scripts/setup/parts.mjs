import fs from 'node:fs';
import path from 'node:path';
import { startPostgres } from '../postgres/server.mjs';
import { PlainFailure } from './plain-failure.mjs';
import { startScript, until } from './processes.mjs';

const MAIL_CATCHER = path.join(import.meta.dirname, '../mail-catcher.mjs');
const MIGRATE = 'api/dist/src/migrate.js';
const SEED = 'api/dist/scripts/demo/seed.js';
const HEALTH_LIMIT_MS = 120_000;

/** Starts the database of a data folder as part of the crew. Resolves to what startPostgres gives. */
export async function startDatabase(crew, claim, dataFolder) {
  const postgres = await startPostgres({ dataFolder });
  crew.add(() => postgres.stop());
  claim.note('postgres', postgres.keeper.pid);
  return postgres;
}

/** Starts the mail catcher. Resolves to { child, smtpPort, webPort }. */
export async function startMailCatcher(crew, claim) {
  const child = crew.addChild(startScript(MAIL_CATCHER));
  claim.note('mail catcher', child.pid);
  const ports = await Promise.race([new Promise((resolve) => child.once('message', resolve)), child.done]);
  if (typeof ports === 'number')
    throw new PlainFailure('The mail catcher did not start; the lines above say why.');
  return { child, ...ports };
}

/** Brings the database to the newest migration and makes the demo club where there is none. */
export async function prepareData(crew, root, env) {
  const node = [process.execPath, '--enable-source-maps'];
  await crew.run([...node, path.join(root, MIGRATE)], 'the migration of the database', env);
  const seed = path.join(root, SEED);
  if (fs.existsSync(seed)) await crew.run([...node, seed], 'making the demo club', env);
}

/** Waits until `child` answers at an address that all is ready; fails when it ends before. */
export async function waitUntilHealthy(address, child) {
  let ended = false;
  void child.done.then(() => (ended = true));
  const isHealthy = async () => (await fetch(`${address}/api/health`).catch(() => null))?.ok === true;
  await until(async () => ended || (await isHealthy()), HEALTH_LIMIT_MS);
  if (ended) throw new PlainFailure(`What should answer at ${address} ended while it started.`);
  if (!(await isHealthy()))
    throw new PlainFailure(`${address}/api/health did not say that all is ready within two minutes.`);
}
