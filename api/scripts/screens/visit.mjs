import fs from 'node:fs';
import path from 'node:path';
import { faultsOfPage, faultsWhenNarrow, redNightFaults } from './checks.mjs';
import { PEOPLE } from './people.mjs';

const LIMIT_MS = 15_000;
/** What is painted after the content stands: the map, fonts, a sheet that slides in. */
const SETTLE_MS = 400;
const IS_SELECTOR = /^(\.|h1$|td$|canvas$)/;

/** Visits the screens of all people at one size, in all themes. Resolves to [{ name, theme, size, file, faults }]. */
export async function visit(browser, { app, out, size, device, themes, screens }) {
  const workPage = await browser.newPage();
  const results = [];
  for (const who of Object.keys(PEOPLE)) {
    const own = screens.filter((screen) => screen.who === who);
    if (own.length === 0) continue;
    const context = await browser.newContext({ baseURL: app, ...device });
    context.setDefaultTimeout(LIMIT_MS);
    const page = await context.newPage();
    const faults = [];
    page.on('pageerror', (error) => faults.push(`error: ${error.message}`));
    const found = await PEOPLE[who](page, size);
    for (const theme of themes) {
      const folder = path.join(out, `${theme}-${size}`);
      fs.mkdirSync(folder, { recursive: true });
      await page.evaluate((value) => localStorage.setItem('harkmoor.theme', value), theme).catch(() => {});
      for (const screen of own) {
        const result = await look({ page, workPage, screen, found, theme, size, folder });
        results.push({ ...result, faults: [...result.faults, ...faults.splice(0)] });
      }
    }
    await context.close();
  }
  await workPage.close();
  return results;
}

async function look({ page, workPage, screen, found, theme, size, folder }) {
  const { name, at, ready, act } = screen;
  const result = { name, theme, size, faults: [] };
  const address = at(found);
  if (!address) return { ...result, faults: ['there is no such thing in the demo to show'] };
  try {
    await open(page, address, theme);
    await page
      .locator(IS_SELECTOR.test(ready) ? ready : `text=${ready}`)
      .locator('visible=true')
      .first()
      .waitFor();
    await act?.(page);
    await page.evaluate(() => document.fonts.ready.then(() => undefined));
    await page.waitForTimeout(SETTLE_MS);
    const file = path.join(folder, `${name}.png`);
    const png = await page.screenshot({ path: file });
    const faults = await faultsOfPage(page);
    if (theme === 'red-night') faults.push(...(await redNightFaults(workPage, png)));
    if (size === 'phone' && theme === 'day') faults.push(...(await faultsWhenNarrow(page)));
    return { ...result, file, faults };
  } catch (error) {
    return { ...result, faults: [`could not be shown: ${error.message.split('\n')[0]}`] };
  }
}

/** A fresh opening in the theme: what the application paints first is part of what is looked at. */
async function open(page, address, theme) {
  // a rain lock outlives a reload
  await page.evaluate(() => sessionStorage.removeItem('harkmoor.rain-lock')).catch(() => {});
  await page.goto(address);
  const isThemed = await page.evaluate(
    (value) =>
      document.documentElement.dataset.theme === value || void localStorage.setItem('harkmoor.theme', value),
    theme,
  );
  if (!isThemed) await page.goto(address);
}
