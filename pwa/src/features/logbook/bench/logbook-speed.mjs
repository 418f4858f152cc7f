// node pwa/src/features/logbook/bench/logbook-speed.mjs [dist folder] [receptions]: how the logbook does with many receptions.
import path from 'node:path';
import { chromium } from 'playwright-core';
import { fillLog } from './sample-log.mjs';
import { serveBuild } from './served-build.mjs';

const folder = path.resolve(process.argv[2] ?? path.join(import.meta.dirname, '../../../../dist'));
const receptionCount = Number(process.argv[3] ?? 100_000);
const SEARCHES = ['lind', 'carr', 'hetero', 'skov', 'entry 777', 'voice est'];
const VIEWS = { phone: { width: 390, height: 844 }, laptop: { width: 1280, height: 800 } };

const build = await serveBuild(folder);
const browser = await chromium.launch({
  executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
  args: ['--no-sandbox'],
});
try {
  const context = await browser.newContext({ viewport: VIEWS.phone, serviceWorkers: 'block' });
  await context.addInitScript(() => localStorage.setItem('harkmoor.open-log', 'guest'));
  const page = await context.newPage();
  await page.goto(`${build.address}/field`);
  await page.waitForSelector('ion-content');
  await page.waitForTimeout(1000);
  await page.goto(`${build.address}/theme.js`);
  const filledAt = Date.now();
  await page.evaluate(fillLog, { receptionCount, perOuting: 40 });
  print('filled', `${receptionCount} receptions in ${((Date.now() - filledAt) / 1000).toFixed(0)} s`);
  await page.setContent('<div style="height:900000px">empty</div>');
  print('empty page, frames of a 5 s scroll', frameWords(await page.evaluate(scrollFrames, null)));
  for (const [name, size] of Object.entries(VIEWS)) {
    await page.setViewportSize(size);
    await measure(page, name);
  }
} finally {
  await browser.close();
  build.close();
}

async function measure(page, name) {
  const rows = name === 'phone' ? '.log-row:not(.log-row-coming)' : '.log-table-row a';
  await page.goto(`${build.address}/settings`);
  await page.waitForTimeout(1500);
  const first = [];
  for (const _ of [1, 2, 3]) {
    await page.evaluate(() => document.querySelector('a[href="/field"], ion-tab-button')?.click());
    await page.goto(`${build.address}/settings`);
    await page.waitForTimeout(1500);
    first.push(await page.evaluate(openFirst, rows));
  }
  print(`${name}: from the tap on Logbook to rows`, first.map((ms) => `${ms.toFixed(0)} ms`).join(', '));
  const readAt = Date.now();
  await page.waitForFunction(
    () => /\d receptions$/.test(document.querySelector('[role=status].num')?.textContent ?? ''),
    null,
    { timeout: 120_000 },
  );
  print(`${name}: all read after`, `${((Date.now() - readAt) / 1000).toFixed(1)} s more`);
  print(`${name}: frames of a 5 s scroll`, frameWords(await page.evaluate(scrollFrames, '.log-scroll')));
  const times = [];
  for (const text of SEARCHES) times.push(await page.evaluate(searchFor, text));
  print(
    `${name}: word-prefix search`,
    SEARCHES.map((text, at) => `${text} ${times[at].toFixed(0)} ms`).join(', '),
  );
}

/** In the page: opens the logbook by its link and gives the ms until a row stands there. */
function openFirst(selector) {
  return new Promise((resolve) => {
    const startMs = performance.now();
    const look = () =>
      document.querySelector(selector) ? resolve(performance.now() - startMs) : requestAnimationFrame(look);
    const link = [...document.querySelectorAll('a, ion-tab-button')].find(
      (each) => each.getAttribute('href') === '/logbook' && each.getClientRects().length > 0,
    );
    link.click();
    look();
  });
}

/** In the page: scrolls for 5 s, 40 px a frame, and gives the intervals of the frames and how many showed a row on its way. */
function scrollFrames(selector) {
  return new Promise((resolve) => {
    const element = selector ? document.querySelector(selector) : document.scrollingElement;
    const intervals = [];
    let coming = 0;
    let last = performance.now();
    const endMs = last + 5000;
    const step = (now) => {
      intervals.push(now - last);
      last = now;
      if (document.querySelector('.log-row-coming')) coming += 1;
      element.scrollTop += 40;
      if (now < endMs) requestAnimationFrame(step);
      else resolve({ intervals: intervals.slice(1), coming });
    };
    requestAnimationFrame(step);
  });
}

/** In the page: types a search at once and gives the ms until the list tells another count. */
function searchFor(text) {
  return new Promise((resolve) => {
    const field = document.querySelector('input[type=search]');
    const status = document.querySelector('[role=status].num');
    const before = status.textContent;
    const set = Object.getOwnPropertyDescriptor(Object.getPrototypeOf(field), 'value').set;
    const startMs = performance.now();
    set.call(field, text);
    field.dispatchEvent(new Event('input', { bubbles: true }));
    const look = () =>
      status.textContent !== before ? setTimeout(() => resolve(took), 600) : requestAnimationFrame(look);
    let took = 0;
    const timed = () => {
      took = performance.now() - startMs;
      look();
    };
    new MutationObserver((_, observer) => {
      observer.disconnect();
      timed();
    }).observe(status, { childList: true, characterData: true, subtree: true });
  });
}

function frameWords({ intervals, coming }) {
  const sorted = [...intervals].sort((a, b) => a - b);
  const at = (share) => sorted[Math.min(sorted.length - 1, Math.floor(sorted.length * share))].toFixed(1);
  const late = coming > 0 ? `, ${coming} frames with a row on its way` : '';
  return `${sorted.length} frames, median ${at(0.5)} ms, p95 ${at(0.95)} ms, worst ${at(1)} ms${late}`;
}

function print(name, words) {
  process.stdout.write(`${name}: ${words}\n`);
}
