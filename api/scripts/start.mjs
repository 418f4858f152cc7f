// npm start: from a fresh clone to a served app, with a database of its own. Built-ins only until packages are installed.
import './setup/node-version.mjs';
import fs from 'node:fs';
import path from 'node:path';
import { announce } from './setup/announcement.mjs';
import { buildAll } from './setup/build.mjs';
import { withCrew } from './setup/crew.mjs';
import { claimDataFolder, openDataFolder } from './setup/data-folder.mjs';
import { apiEnvironment } from './setup/environment.mjs';
import { installPackages } from './setup/install.mjs';
import { prepareData, startDatabase, startMailCatcher, waitUntilHealthy } from './setup/parts.mjs';
import { PlainFailure } from './setup/plain-failure.mjs';
import { webPort } from './setup/ports.mjs';
import { startScript } from './setup/processes.mjs';
import { ensurePostgres } from './postgres/binaries.mjs';

const root = path.resolve(import.meta.dirname, '../..');
process.chdir(root);

await withCrew(async (crew) => {
  const dataFolder = openDataFolder(root);
  const claim = await claimDataFolder(dataFolder);
  crew.add(() => claim.release());
  // what can fail for a reason that the reader can mend comes before the minutes of installing
  const port = await webPort();
  const address = `http://127.0.0.1:${port}`;
  claim.setAddress(address);
  ensurePostgres();
  await installPackages(root, crew.run.bind(crew));
  await buildAll(root, crew.run.bind(crew));

  const postgres = await startDatabase(crew, claim, dataFolder);
  const mail = await startMailCatcher(crew, claim);
  const settings = {
    dataFolder,
    databaseUrl: postgres.url,
    port,
    publicUrl: address,
    smtpPort: mail.smtpPort,
  };
  const env = apiEnvironment({ ...settings, mode: 'production' });
  await prepareData(crew, root, env);

  const logPath = path.join(dataFolder, 'api.log');
  const api = crew.addChild(startApi(logPath, env));
  claim.note('api', api.pid);
  await waitUntilHealthy(address, api).catch((error) => {
    throw new PlainFailure(`${error.message}\n${fs.readFileSync(logPath, 'utf8').slice(-3_000)}`);
  });
  const lines = [
    ['App', address],
    ['API description', `${address}/api/docs`],
    ['Mail catcher', `http://127.0.0.1:${mail.webPort}`],
    ['Log of the API', path.relative(root, logPath)],
  ];
  announce(lines, dataFolder);
  const ended = { api: api.done, 'mail catcher': mail.child.done, PostgreSQL: postgres.keeper.done };
  const name = await Promise.race(Object.entries(ended).map(([part, done]) => done.then(() => part)));
  throw new PlainFailure(`The ${name} ended on its own; see ${logPath} and ${postgres.logPath}.`);
});

/** Starts the API with its lines in a file, so that a closed terminal takes nothing from it. */
function startApi(logPath, env) {
  if (fs.existsSync(logPath) && fs.statSync(logPath).size > 10_000_000)
    fs.renameSync(logPath, `${logPath}.old`);
  const log = fs.openSync(logPath, 'a', 0o600);
  const child = startScript(path.join(root, 'api/dist/src/main.js'), [], {
    env,
    output: log,
    nodeOptions: ['--enable-source-maps'],
  });
  fs.closeSync(log);
  return child;
}
