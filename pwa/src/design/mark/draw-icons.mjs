// Draws the PNG icons from launcher.svg: `node pwa/src/design/mark/draw-icons.mjs`, only when the mark changes.
//
// The launcher icon is black and red on purpose: the system shows it, with the manifest's background, as the splash
// before the first frame of ours, and a person with dark-adapted eyes must not be dazzled by it.
import { readFile, writeFile } from 'node:fs/promises';
import { chromium } from 'playwright-core';

const source = await readFile(new URL('launcher.svg', import.meta.url), 'utf8');
const target = new URL('../../../public/icons/', import.meta.url);

/** The part of the drawing's 512 units that is shown; a maskable icon keeps a margin that the system may cut. */
const ICONS = [
  { name: 'harkmoor-192', sizePx: 192, viewBox: '0 0 512 512', cornerShare: 0.2 },
  { name: 'harkmoor-512', sizePx: 512, viewBox: '0 0 512 512', cornerShare: 0.2 },
  { name: 'harkmoor-maskable-512', sizePx: 512, viewBox: '-40 -30 592 592', cornerShare: 0 },
  { name: 'harkmoor-apple-touch', sizePx: 180, viewBox: '0 0 512 512', cornerShare: 0 },
];

const browser = await chromium.launch({
  executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
  args: ['--no-sandbox', '--force-color-profile=srgb'],
});
for (const { name, sizePx, viewBox, cornerShare } of ICONS) {
  const page = await browser.newPage({ viewport: { width: sizePx, height: sizePx } });
  const svg = source
    .replace('0 0 512 512', viewBox)
    .replace('<rect width="512" height="512"', '<rect x="-64" y="-64" width="640" height="640"');
  await page.setContent(
    `<style>body{margin:0}svg{display:block;width:${sizePx}px;height:${sizePx}px;border-radius:${sizePx * cornerShare}px}</style>${svg}`,
  );
  await writeFile(new URL(`${name}.png`, target), await page.screenshot({ omitBackground: true }));
  await page.close();
}
await browser.close();
