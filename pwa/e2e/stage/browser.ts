import path from 'node:path';
import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';
import { afterAll, beforeAll, onTestFailed } from 'vitest';
import { APP } from './addresses';
import { shiftClock } from './shift-clock';

const FLAGS = [
  ...['--no-sandbox', '--disable-gpu', '--disable-quic', '--no-first-run'],
  ...['--disable-background-networking', '--disable-component-update', '--disable-sync'],
];
const ACTION_LIMIT_MS = 30_000;

/** One person's device: a profile of its own, the tab in front, and what the application said that it should not. */
export type Device = {
  readonly context: BrowserContext;
  page: Page;
  /** Uncaught errors of all tabs. */
  readonly faults: string[];
  setSignal(hasSignal: boolean): Promise<void>;
  /** Opens an address of the application in the tab in front, as typed by hand. */
  open(path: string): Promise<void>;
  /** Kills the renderer of the tab, as a phone does when memory runs out, and opens a fresh tab. */
  killTab(): Promise<void>;
};

type DeviceWishes = { readonly screen?: 'phone' | 'laptop'; readonly clockAheadMs?: number };

/** A browser for the journeys of one file. Returns the way to open devices, which are closed with it. */
export function useBrowser(): { device(wishes?: DeviceWishes): Promise<Device> } {
  let browser: Browser | undefined;
  beforeAll(async () => {
    browser = await chromium.launch({
      executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
      args: FLAGS,
    });
  });
  afterAll(() => browser?.close());
  return {
    device: async (wishes = {}) => {
      if (!browser) throw new Error('a device was asked for outside a journey');
      const device = await openDevice(browser, wishes);
      onTestFailed(({ task }) => keepPicture(device, task.name));
      return device;
    },
  };
}

/** What the device showed when the journey failed, beside the pictures of the screens. */
async function keepPicture({ page }: Device, journey: string): Promise<void> {
  const name = `${journey.replace(/[^a-z0-9]+/gi, '-').slice(0, 60)}-${Date.now()}.png`;
  const picture = path.join(import.meta.dirname, '../../../.screens/journeys', name);
  await page.screenshot({ path: picture, timeout: 5_000 }).catch(() => undefined);
  console.error(`${page.url()}: ${picture}`);
}

async function openDevice(
  browser: Browser,
  { screen = 'phone', clockAheadMs = 0 }: DeviceWishes,
): Promise<Device> {
  const isPhone = screen === 'phone';
  const context = await browser.newContext({
    baseURL: APP,
    viewport: isPhone ? { width: 390, height: 844 } : { width: 1280, height: 800 },
    isMobile: isPhone,
    hasTouch: isPhone,
    acceptDownloads: true,
  });
  context.setDefaultTimeout(ACTION_LIMIT_MS);
  if (clockAheadMs !== 0) await context.addInitScript(shiftClock, clockAheadMs);
  const faults: string[] = [];
  context.on('weberror', (error) => faults.push(error.error().stack ?? error.error().message));
  const device: Device = {
    context,
    page: await context.newPage(),
    faults,
    setSignal: (hasSignal) => context.setOffline(!hasSignal),
    open: async (path) => void (await device.page.goto(path)),
    killTab: async () => {
      await crash(device.page);
      device.page = await context.newPage();
    },
  };
  return device;
}

async function crash(page: Page): Promise<void> {
  const session = await page.context().newCDPSession(page);
  const crashed = page.waitForEvent('crash');
  session.send('Page.crash').catch(() => undefined); // the answer never comes: its sender is gone
  await crashed;
  await page.close({ runBeforeUnload: false });
}
