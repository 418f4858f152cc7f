import fs from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { FIELD_IS_USABLE, startGuestOuting, untilInstalled, withPhone } from './guest-phone.mjs';
import { summary } from './statistics.mjs';

const RUNS = 5;
const SLOWED = 4;
/** Long enough to hold what the application fetches ahead once it is idle. */
const WATCHED_AFTER_MS = 10_000;

/**
 * From a closed browser, installed, no network, CPU slowed 4×: milliseconds from the navigation to a usable Field, and the
 * longest task before it and in the ten seconds after it. The worker's own thread is not slowed: the browser offers no way to.
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
      longestTaskBeforeMs: Math.max(...runs.map(({ before }) => before)),
      longestTaskAfterMs: Math.max(...runs.map(({ after }) => after)),
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
  return page.evaluate(() => {
    const { usableMs, longTasks } = globalThis;
    const longest = (tasks) => Math.max(0, ...tasks.map(({ ms }) => ms));
    return {
      usableMs,
      before: longest(longTasks.filter(({ at }) => at < usableMs)),
      after: longest(longTasks.filter(({ at }) => at >= usableMs)),
    };
  });
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
