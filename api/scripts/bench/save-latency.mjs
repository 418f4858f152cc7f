import { chromium } from 'playwright-core';
import { CHROMIUM_FLAGS } from '../setup/chromium-flags.mjs';
import { fillLog } from '../../../pwa/src/features/logbook/bench/sample-log.mjs';
import { PHONE, startGuestOuting } from './guest-phone.mjs';
import { summary } from './statistics.mjs';

const SAVES = 25;
const WARM_UP = 3;

/**
 * From the tap on *Save* to the entry in Field's list, with so many receptions on the device, and beside it a bare strictly
 * durable IndexedDB write of a record of that size in the same page, in turns.
 */
export async function saveLatency(address, receptionCount) {
  const browser = await chromium.launch({ executablePath: process.env.CHROMIUM, args: CHROMIUM_FLAGS });
  try {
    const context = await browser.newContext({ ...PHONE, serviceWorkers: 'block' });
    await context.addInitScript(noteWrites);
    const page = await context.newPage();
    await startGuestOuting(page, address);
    await page.goto(`${address}/theme.js`); // a page of the same origin that holds no database open
    await page.evaluate(fillLog, { receptionCount, perOuting: 40 });
    await page.goto(`${address}/field`);
    const stored = [];
    const saves = [];
    const bare = [];
    for (let n = 0; n < SAVES + WARM_UP; n++) {
      await openPad(page, 5_900 + 5 * n);
      const { storedMs, shownMs } = await page.evaluate(tapSave);
      const bareMs = await page.evaluate(bareWrite);
      if (n < WARM_UP) continue;
      stored.push(storedMs);
      saves.push(shownMs);
      bare.push(bareMs);
    }
    return { receptionCount, stored: summary(stored), save: summary(saves), bare: summary(bare) };
  } finally {
    await browser.close();
  }
}

async function openPad(page, kHz) {
  await page.getByRole('link', { name: 'Other frequency, kHz' }).click();
  await page.getByRole('textbox', { name: /^Frequency in kHz/ }).fill(String(kHz));
  await page.getByRole('button', { name: /^Heard, / }).click();
  await page.locator('[data-cell="s4"]').click();
  await page.waitForTimeout(700); // the draft of the last touch is written by then
}

/** Runs in the page before its own code: notes when a transaction that may write receptions is complete. */
function noteWrites() {
  const { prototype } = globalThis.IDBDatabase;
  const open = prototype.transaction;
  prototype.transaction = function (stores, mode, options) {
    const transaction = open.call(this, stores, mode, options);
    if (mode === 'readwrite' && [stores].flat().includes('reception'))
      transaction.addEventListener('complete', () => (globalThis.receptionStoredMs = performance.now()));
    return transaction;
  };
}

/**
 * Runs in the page: taps Save, resolves to the milliseconds until the entry is durable, and until the frame in which the list
 * has one entry more.
 */
function tapSave() {
  const count = () => document.querySelectorAll('.fd-other-entry').length;
  const isShown = () =>
    [...document.querySelectorAll('.fd-other-entry')].some((row) => row.getBoundingClientRect().height > 0);
  const before = count();
  const key = [...document.querySelectorAll('button')].find(
    (button) => /^Save/.test(button.textContent) && button.getBoundingClientRect().height > 0,
  );
  return new Promise((resolve) => {
    const startedMs = performance.now();
    key.click();
    const look = () => {
      if (count() > before && isShown())
        resolve({
          storedMs: globalThis.receptionStoredMs - startedMs,
          shownMs: performance.now() - startedMs,
        });
      else requestAnimationFrame(look);
    };
    requestAnimationFrame(look);
  });
}

/** Runs in the page: one strictly durable write into a database of its own, in milliseconds. */
async function bareWrite() {
  const database = await new Promise((resolve, reject) => {
    const request = indexedDB.open('bench-bare', 1);
    request.onupgradeneeded = () => request.result.createObjectStore('record', { keyPath: 'id' });
    request.onsuccess = () => resolve(request.result);
    request.onerror = () => reject(request.error);
  });
  const startedMs = performance.now();
  await new Promise((resolve, reject) => {
    const transaction = database.transaction('record', 'readwrite', { durability: 'strict' });
    transaction.objectStore('record').put({ id: crypto.randomUUID(), fields: 'x'.repeat(900) });
    transaction.oncomplete = resolve;
    transaction.onerror = () => reject(transaction.error);
  });
  const tookMs = performance.now() - startedMs;
  database.close();
  return tookMs;
}
