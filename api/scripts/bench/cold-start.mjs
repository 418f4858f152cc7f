import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { FIELD_IS_USABLE, startGuestOuting, untilInstalled, withPhone } from './guest-phone.mjs';
import { summary } from './statistics.mjs';

const RUNS = 5;
const SLOWED = 4;
const WATCHED_AFTER_MS = 4_000;

/**
 * From a closed browser, installed, no network, CPU slowed 4×: milliseconds from the navigation to a usable Field, and the
 * longest task in the four seconds after it. The worker's own thread is not slowed: the browser offers no way to.
 */
export async function coldStart(address) {
  const profile = fs.mkdtempSync(path.join(os.tmpdir(), 'harkmoor-cold-'));
  try {
    await withPhone(profile, {}, async (context) => {
      const [page] = context.pages();
      await startGuestOuting(page, address);
      await untilInstalled(page, address);
    });
    const runs = [];
    for (let run = 0; run < RUNS; run++)
      runs.push(
        await withPhone(profile, {}, (context) =>
          openSlowed(context, `${address}/field`, FIELD_IS_USABLE, true),
        ),
      );
    return {
      usable: summary(runs.map(({ usableMs }) => usableMs)),
      longestTaskAfterMs: Math.max(...runs.map(({ longestTaskMs }) => longestTaskMs)),
    };
  } finally {
    fs.rmSync(profile, { recursive: true, force: true });
  }
}

/** The same for another page that a server on this machine gives, for comparison. */
export async function slowedOpening(address, selector) {
  const values = [];
  for (let run = 0; run < RUNS; run++) {
    const profile = fs.mkdtempSync(path.join(os.tmpdir(), 'harkmoor-plain-'));
    const { usableMs } = await withPhone(profile, {}, (context) =>
      openSlowed(context, address, selector, false),
    );
    values.push(usableMs);
    fs.rmSync(profile, { recursive: true, force: true });
  }
  return summary(values);
}

async function openSlowed(context, address, selector, isOffline) {
  const [page] = context.pages();
  await context.setOffline(isOffline);
  await page.addInitScript(watchFor, selector);
  const session = await context.newCDPSession(page);
  await session.send('Emulation.setCPUThrottlingRate', { rate: SLOWED });
  await page.goto(address, { waitUntil: 'commit' });
  await page.waitForFunction(() => globalThis.usableMs !== undefined, null, { timeout: 60_000 });
  await page.waitForTimeout(WATCHED_AFTER_MS);
  return page.evaluate(() => ({
    usableMs: globalThis.usableMs,
    longestTaskMs: Math.max(
      0,
      ...globalThis.longTasks.filter(({ at }) => at >= globalThis.usableMs).map(({ ms }) => ms),
    ),
  }));
}

/** Runs in the page before its own code: notes when the selector is painted, and every long task. */
function watchFor(selector) {
  globalThis.longTasks = [];
  new PerformanceObserver((list) => {
    for (const { startTime, duration } of list.getEntries())
      globalThis.longTasks.push({ at: startTime, ms: duration });
  }).observe({ type: 'longtask', buffered: true });
  const look = () => {
    const found = document.querySelector(selector);
    if (found && found.getBoundingClientRect().height > 0) globalThis.usableMs = performance.now();
    else requestAnimationFrame(look);
  };
  requestAnimationFrame(look);
}
