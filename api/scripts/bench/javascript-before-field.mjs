import { gzipSync } from 'node:zlib';
import { chromium } from 'playwright-core';
import { CHROMIUM_FLAGS } from '../setup/chromium-flags.mjs';
import { FIELD_IS_USABLE, PHONE, startGuestOuting } from './guest-phone.mjs';

/**
 * The scripts that a phone without a worker and with an empty cache fetches before a running outing's Field is usable:
 * [{ file, bytes, gzipBytes }], largest first.
 */
export async function javascriptBeforeField(address) {
  const browser = await chromium.launch({ executablePath: process.env.CHROMIUM, args: CHROMIUM_FLAGS });
  try {
    const context = await browser.newContext({ ...PHONE, serviceWorkers: 'block' });
    const first = await context.newPage();
    await startGuestOuting(first, address);
    await first.close();
    return await scriptsOf(context, `${address}/field`);
  } finally {
    await browser.close();
  }
}

async function scriptsOf(context, address) {
  const page = await context.newPage();
  const session = await context.newCDPSession(page);
  await session.send('Network.enable');
  await session.send('Network.setCacheDisabled', { cacheDisabled: true });
  const answers = [];
  page.on('response', (answer) => answers.push(answer));
  await page.goto(address, { waitUntil: 'commit' });
  await page.locator(FIELD_IS_USABLE).waitFor();
  const scripts = answers.filter((answer) => answer.request().resourceType() === 'script');
  const found = [];
  for (const answer of scripts) {
    const body = await answer.body();
    found.push({
      file: new URL(answer.url()).pathname,
      bytes: body.length,
      gzipBytes: gzipSync(body, { level: 9 }).length,
    });
  }
  await page.close();
  return found.sort((a, b) => b.gzipBytes - a.gzipBytes);
}
