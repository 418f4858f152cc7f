// npm run bench: figures of this machine, printed and written to .bench/. Nothing is asserted: machines differ.
// `npm run bench -- save push` measures only the parts named.
import './setup/node-version.mjs';
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { outputOf } from './setup/processes.mjs';
import { buildAll } from './setup/build.mjs';
import { ensureChromium } from './setup/chromium.mjs';
import { withCrew } from './setup/crew.mjs';
import { PlainFailure } from './setup/plain-failure.mjs';
import { ensurePostgres } from './postgres/binaries.mjs';
import { startPostgres } from './postgres/server.mjs';
import { serveFolder } from './bench/built-app.mjs';
import { coldStart, slowedOpening } from './bench/cold-start.mjs';
import { buildEmptyIonicPage } from './bench/empty-ionic-page.mjs';
import { javascriptBeforeField } from './bench/javascript-before-field.mjs';
import { machine } from './bench/machine.mjs';
import { saveLatency } from './bench/save-latency.mjs';
import { summaryWords } from './bench/statistics.mjs';

const RECEPTION_COUNTS = [10_000, 100_000];
/** The rest is in the written figures. */
const FILES_PRINTED = 12;
const PARTS = { javascript, start, save, push };

const root = path.resolve(import.meta.dirname, '../..');
process.chdir(root);
process.env.CHROMIUM = ensureChromium();

await withCrew(async (crew) => {
  const names = chosenParts(process.argv.slice(2));
  await buildAll(root, crew.run.bind(crew));
  const figures = { machine: machine(outputOf(process.env.CHROMIUM, ['--version', '--no-sandbox'])) };
  console.log(JSON.stringify(figures.machine, null, 1));
  const app = await serveFolder(path.join(root, 'pwa/dist'));
  crew.add(app.close);
  for (const name of names) figures[name] = await PARTS[name](app.address, crew);
  const file = path.join(root, '.bench', `${figures.machine.date.replace(/[:.]/g, '-')}.json`);
  fs.mkdirSync(path.dirname(file), { recursive: true });
  fs.writeFileSync(file, `${JSON.stringify(figures, null, 2)}\n`);
  console.log(`\nWritten to ${path.relative(root, file)}`);
  return 0;
});

async function javascript(address) {
  const files = await javascriptBeforeField(address);
  const gzipBytes = files.reduce((sum, each) => sum + each.gzipBytes, 0);
  line(
    'JavaScript before Field is usable',
    `${(gzipBytes / 1000).toFixed(1)} kB gzip in ${files.length} files`,
  );
  for (const each of files.slice(0, FILES_PRINTED))
    line(`  ${each.file}`, `${(each.gzipBytes / 1000).toFixed(1)} kB`);
  return { gzipBytes, files };
}

async function start(address, crew) {
  const cold = await coldStart(address);
  line('cold start, installed, no network, CPU ÷ 4', summaryWords(cold.usable));
  line('  longest task before it', `${cold.longestTaskBeforeMs.toFixed(0)} ms`);
  line('  longest task in the 10 s after it', `${cold.longestTaskAfterMs.toFixed(0)} ms`);
  const folder = await buildEmptyIonicPage(root);
  const empty = await serveFolder(folder);
  crew.add(async () => {
    await empty.close();
    fs.rmSync(folder, { recursive: true, force: true });
  });
  const emptyIonic = await slowedOpening(empty.address, '.empty-page');
  line('  an empty Ionic page, from this machine’s server', summaryWords(emptyIonic));
  return { ...cold, emptyIonic };
}

async function save(address) {
  const results = [];
  for (const count of RECEPTION_COUNTS) {
    const result = await saveLatency(address, count);
    line(
      `save to shown, ${count} receptions`,
      `${summaryWords(result.save)}, p99 ${result.save.p99.toFixed(1)}`,
    );
    line('  of it until it is durable', summaryWords(result.stored));
    line('  a bare strict IndexedDB write', summaryWords(result.bare));
    line('  times the bare write, medians', (result.save.median / result.bare.median).toFixed(2));
    results.push(result);
  }
  return results;
}

async function push(_address, crew) {
  ensurePostgres();
  const dataFolder = fs.mkdtempSync(path.join(os.tmpdir(), 'harkmoor-bench-'));
  fs.chmodSync(dataFolder, 0o755); // the database's own user passes through it
  const postgres = await startPostgres({ dataFolder, throwAway: true });
  crew.add(() => postgres.stop());
  const { benchPush } = await import('../dist/scripts/bench/push.js');
  const rows = await benchPush(postgres.url);
  for (const { name, medianMs, worstMs } of rows) {
    const unit = name.startsWith('times') ? '' : ' ms';
    line(name, `${medianMs.toFixed(unit ? 0 : 2)}${unit}, worst ${worstMs.toFixed(unit ? 0 : 2)}`);
  }
  return rows;
}

function line(what, figure) {
  console.log(`${what.padEnd(56)} ${figure}`);
}

function chosenParts(words) {
  const unknown = words.find((word) => !(word in PARTS));
  if (unknown)
    throw new PlainFailure(`There is no part "${unknown}"; there are ${Object.keys(PARTS).join(', ')}.`);
  return words.length > 0 ? words : Object.keys(PARTS);
}
