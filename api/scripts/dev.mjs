// npm run dev: the app from its sources, with hot reload of app, model and API. The address is that of the app's dev server.
import './setup/node-version.mjs';
import path from 'node:path';
import { announce } from './setup/announcement.mjs';
import { TSC, VITE, buildServer } from './setup/build.mjs';
import { withCrew } from './setup/crew.mjs';
import { claimDataFolder, openDataFolder } from './setup/data-folder.mjs';
import { apiEnvironment } from './setup/environment.mjs';
import { installPackages } from './setup/install.mjs';
import { prepareData, startDatabase, startMailCatcher, waitUntilHealthy } from './setup/parts.mjs';
import { PlainFailure } from './setup/plain-failure.mjs';
import { freePort, webPort } from './setup/ports.mjs';
import { startCommand } from './setup/processes.mjs';
import { ensurePostgres } from './postgres/binaries.mjs';

const root = path.resolve(import.meta.dirname, '../..');
process.chdir(root);

await withCrew(async (crew) => {
  const dataFolder = openDataFolder(root);
  const claim = await claimDataFolder(dataFolder);
  crew.add(() => claim.release());
  const port = await webPort();
  const address = `http://127.0.0.1:${port}`;
  claim.setAddress(address);
  ensurePostgres();
  await installPackages(root, crew.run.bind(crew));
  await buildServer(crew.run.bind(crew));

  const postgres = await startDatabase(crew, claim, dataFolder);
  const mail = await startMailCatcher(crew, claim);
  const apiPort = await freePort();
  const settings = {
    dataFolder,
    databaseUrl: postgres.url,
    port: apiPort,
    publicUrl: address,
    smtpPort: mail.smtpPort,
  };
  const env = apiEnvironment({ ...settings, mode: 'development' });
  await prepareData(crew, root, env);

  const watch = (name, args, more = {}) => {
    const child = crew.addChild(startCommand(process.execPath, args, { env: more }));
    claim.note(name, child.pid);
    return child;
  };
  const compiler = watch('compiler', [TSC, '-b', '-w', '--preserveWatchOutput', 'sync-model', 'api']);
  const apiArgs = ['--watch', '--watch-preserve-output', '--enable-source-maps', 'api/dist/src/main.js'];
  const api = watch('api', apiArgs, env);
  const viteArgs = [VITE, '--host', '127.0.0.1', '--port', String(port), '--strictPort', 'pwa'];
  const vite = watch('app', viteArgs, { API_URL: `http://127.0.0.1:${apiPort}` });
  await waitUntilHealthy(`http://127.0.0.1:${apiPort}`, api);
  await waitUntilHealthy(address, vite); // the app's dev server passes /api on
  const lines = [
    ['App', address],
    ['API', `http://127.0.0.1:${apiPort}/api/docs`],
    ['Mail catcher', `http://127.0.0.1:${mail.webPort}`],
  ];
  announce(lines, dataFolder);
  const ended = { compiler: compiler.done, API: api.done, app: vite.done, 'mail catcher': mail.child.done };
  const all = Object.entries({ ...ended, PostgreSQL: postgres.keeper.done });
  const name = await Promise.race(all.map(([part, done]) => done.then(() => part)));
  throw new PlainFailure(`The ${name} ended on its own; its lines above or ${postgres.logPath} say why.`);
});
