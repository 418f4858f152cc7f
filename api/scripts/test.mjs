// npm test: brings what the tests need, runs them all, and ends with one line of counts.
// `npm test -- api journeys` runs only the parts named.
import './setup/node-version.mjs';
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { ensureChromium } from './setup/chromium.mjs';
import { withCrew } from './setup/crew.mjs';
import { installPackages } from './setup/install.mjs';
import { PlainFailure } from './setup/plain-failure.mjs';
import { ensurePostgres } from './postgres/binaries.mjs';
import { sumOf } from './test-run/counts.mjs';
import { testParts } from './test-run/parts.mjs';
import { runPart } from './test-run/run-part.mjs';

const root = path.resolve(import.meta.dirname, '../..');
process.chdir(root);

await withCrew(async (crew) => {
  const reportFolder = fs.mkdtempSync(path.join(os.tmpdir(), 'harkmoor-reports-'));
  crew.add(async () => fs.rmSync(reportFolder, { recursive: true, force: true }));
  const parts = chosenParts(testParts(root, reportFolder));
  ensurePostgres();
  process.env.CHROMIUM = ensureChromium();
  await installPackages(root, crew.run.bind(crew));

  const results = [];
  for (const part of parts) results.push(await runPart(crew, root, part));
  console.log('\n── minutes by part');
  for (const { name, minutes, passed, failed, skipped } of results)
    console.log(
      `${name.padEnd(12)} ${minutes.toFixed(1).padStart(5)}   ${passed} passed, ${failed} failed, ${skipped} skipped`,
    );
  const { passed, failed, skipped } = sumOf(results);
  console.log(`\n${passed} passed, ${failed} failed, ${skipped} skipped`);
  return failed > 0 ? 1 : 0;
});

function chosenParts(parts) {
  const names = process.argv.slice(2);
  const unknown = names.find((name) => !parts.some((part) => part.name === name));
  if (unknown)
    throw new PlainFailure(
      `There is no part "${unknown}"; there are ${parts.map(({ name }) => name).join(', ')}.`,
    );
  return names.length > 0 ? parts.filter(({ name }) => names.includes(name)) : parts;
}
