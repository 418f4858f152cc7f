// npm run demo: makes the demo club in the data folder, or finishes one that was cut off, without serving anything.
import './setup/node-version.mjs';
import path from 'node:path';
import { buildServer } from './setup/build.mjs';
import { withCrew } from './setup/crew.mjs';
import { claimDataFolder, openDataFolder } from './setup/data-folder.mjs';
import { apiEnvironment } from './setup/environment.mjs';
import { installPackages } from './setup/install.mjs';
import { prepareData, startDatabase } from './setup/parts.mjs';
import { ensurePostgres } from './postgres/binaries.mjs';

const root = path.resolve(import.meta.dirname, '../..');
process.chdir(root);

await withCrew(async (crew) => {
  const dataFolder = openDataFolder(root);
  const claim = await claimDataFolder(dataFolder);
  crew.add(() => claim.release());
  ensurePostgres();
  await installPackages(root, crew.run.bind(crew));
  await buildServer(crew.run.bind(crew));
  const postgres = await startDatabase(crew, claim, dataFolder);
  // nothing is served and nothing is mailed: the addresses are only there because the API's settings ask for them
  const settings = {
    dataFolder,
    databaseUrl: postgres.url,
    port: 1,
    publicUrl: 'http://127.0.0.1',
    smtpPort: 1,
  };
  await prepareData(crew, root, apiEnvironment({ ...settings, mode: 'production' }));
  console.log(
    `The demo club is in ${dataFolder}, its hidden truth in demo-truth.json there. npm start serves it.`,
  );
});
