// npm run screens: looks at every screen with the demo's data, in three themes and two sizes: pictures, contact sheets, and
// the checks that a machine can make. `npm run screens -- phone red-night field` keeps to what has one of the words of each kind.
import './setup/node-version.mjs';
import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { chromium } from 'playwright-core';
import { ensureChromium } from './setup/chromium.mjs';
import { CHROMIUM_FLAGS } from './setup/chromium-flags.mjs';
import { withCrew } from './setup/crew.mjs';
import { PlainFailure } from './setup/plain-failure.mjs';
import { startStack } from './setup/stack.mjs';
import { makeContactSheet } from './screens/contact-sheet.mjs';
import { SCREENS } from './screens/list.mjs';
import { visit } from './screens/visit.mjs';

const THEMES = ['day', 'dusk', 'red-night'];
const SIZES = {
  phone: { viewport: { width: 390, height: 844 }, isMobile: true, hasTouch: true },
  laptop: { viewport: { width: 1280, height: 800 } },
};

const root = path.resolve(import.meta.dirname, '../..');
process.chdir(root);
const out = path.join(root, '.screens');
const wanted = wishes(process.argv.slice(2));

await withCrew(async (crew) => {
  const executablePath = ensureChromium();
  const app = process.env.SCREENS_APP ?? (await startOwnStack(crew));
  const browser = await chromium.launch({ executablePath, args: CHROMIUM_FLAGS });
  crew.add(() => browser.close());
  const results = [];
  for (const size of wanted.sizes)
    results.push(...(await visit(browser, { app, out, size, device: SIZES[size], ...wanted })));
  for (const size of wanted.sizes)
    for (const theme of wanted.themes) await sheetOf(browser, results, theme, size);
  return report(results);
});

async function startOwnStack(crew) {
  const folder = fs.mkdtempSync(path.join(os.tmpdir(), 'harkmoor-screens-'));
  fs.chmodSync(folder, 0o755); // the database's own user passes through it
  crew.add(async () => fs.rmSync(folder, { recursive: true, force: true }));
  return (await startStack(crew, { root, dataFolder: path.join(folder, 'data') })).app;
}

function wishes(words) {
  const sizes = Object.keys(SIZES).filter((size) => words.includes(size));
  const themes = THEMES.filter((theme) => words.includes(theme));
  const names = words.filter((word) => !(word in SIZES) && !THEMES.includes(word));
  const screens = SCREENS.filter(
    ({ name }) => names.length === 0 || names.some((word) => name.includes(word)),
  );
  if (screens.length === 0) throw new PlainFailure(`No screen is named like ${names.join(', ')}.`);
  return {
    sizes: sizes.length > 0 ? sizes : Object.keys(SIZES),
    themes: themes.length > 0 ? themes : THEMES,
    screens,
  };
}

async function sheetOf(browser, results, theme, size) {
  const pictures = results.filter((one) => one.theme === theme && one.size === size && one.file);
  const folder = path.join(out, `${theme}-${size}`);
  if (pictures.length > 0)
    console.log(path.relative(root, await makeContactSheet(browser, { folder, theme, size, pictures })));
}

function report(results) {
  const faulty = results.filter(({ faults }) => faults.length > 0);
  console.log(`\n${results.length} pictures of ${new Set(results.map(({ name }) => name)).size} screens`);
  for (const { name, theme, size, faults } of faulty)
    for (const fault of faults)
      console.log(`${name.padEnd(20)} ${theme.padEnd(10)} ${size.padEnd(7)} ${fault}`);
  console.log(faulty.length === 0 ? 'No fault found.' : `${faulty.length} of them have faults.`);
  return faulty.length === 0 ? 0 : 1;
}
