import path from 'node:path';
import { PlainFailure } from './plain-failure.mjs';
import { startCommand } from './processes.mjs';

const READY = 'Ctrl-C stops everything';

/**
 * Starts all that `npm start` does, on a data folder and a free port of its own, as part of a crew. Resolves when the app
 * answers, to { child, app, mail }: the addresses of the app and of the mail catcher. The output is passed on until then.
 */
export async function startStack(crew, { root, dataFolder, env = {} }) {
  const child = crew.addChild(
    startCommand(process.execPath, [path.join(root, 'api/scripts/start.mjs')], {
      output: 'pipe',
      env: { HARKMOOR_DATA: dataFolder, PORT: '0', REQUESTS_PER_MINUTE: '1000000', ...env },
    }),
  );
  const said = await saidUntilReady(child);
  const addressAfter = (label) => new RegExp(`^ *${label} +(http://\\S+)`, 'm').exec(said)?.[1];
  return { child, app: addressAfter('App'), mail: addressAfter('Mail catcher') };
}

function saidUntilReady(child) {
  return new Promise((resolve, reject) => {
    let said = '';
    child.stdout.setEncoding('utf8').on('data', (text) => {
      said += text;
      if (said.includes(READY)) resolve(said);
      else process.stdout.write(text);
    });
    void child.done.then(() => reject(new PlainFailure('The stack ended before it was ready; see above.')));
  });
}
