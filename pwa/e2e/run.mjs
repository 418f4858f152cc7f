// The browser journeys: starts the whole stack on a data folder and a port of its own, runs them in Chromium, ends all.
// `node pwa/e2e/run.mjs guest` runs those whose file names hold the word. The last line is the counts as JSON.
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { ensureChromium } from '../../api/scripts/setup/chromium.mjs';
import { withCrew } from '../../api/scripts/setup/crew.mjs';
import { PlainFailure } from '../../api/scripts/setup/plain-failure.mjs';
import { endChild, startCommand } from '../../api/scripts/setup/processes.mjs';
import { startStack } from '../../api/scripts/setup/stack.mjs';
import { countsOf } from '../../api/scripts/test-run/counts.mjs';

const root = path.resolve(import.meta.dirname, '../..');
process.chdir(root);

await withCrew(async (crew) => {
  const chromium = ensureChromium();
  const folder = fs.mkdtempSync(path.join(os.tmpdir(), 'harkmoor-journeys-'));
  fs.chmodSync(folder, 0o755); // the database's own user passes through it
  crew.add(async () => fs.rmSync(folder, { recursive: true, force: true }));
  const stack = await startStack(crew, { root, dataFolder: path.join(folder, 'data') });
  const reportPath = path.join(folder, 'report.json');
  const exitCode = await runJourneys(crew, reportPath, {
    CHROMIUM: chromium,
    JOURNEY_APP: stack.app,
    JOURNEY_MAIL: stack.mail,
  });
  const counts = countsOf({ exitCode, reportPath });
  await endChild(stack.child);
  console.log(JSON.stringify(counts));
  if (counts.passed + counts.failed === 0) throw new PlainFailure('No journey has such a name.');
  return counts.failed > 0 ? 1 : 0;
});

function runJourneys(crew, reportPath, env) {
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${reportPath}`];
  const args = [
    'node_modules/vitest/vitest.mjs',
    'run',
    '--config',
    'pwa/e2e/vitest.config.ts',
    ...reporters,
  ];
  const words = process.argv.slice(2);
  return crew.addChild(startCommand(process.execPath, [...args, ...words], { env })).done;
}
