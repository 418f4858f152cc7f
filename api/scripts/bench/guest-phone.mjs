import { chromium } from 'playwright-core';
import { CHROMIUM_FLAGS } from '../setup/chromium-flags.mjs';

export const PHONE = { viewport: { width: 390, height: 844 }, isMobile: true, hasTouch: true };
/** What Field shows once a thumb can use it: the way to an entry. */
export const FIELD_IS_USABLE = 'a.fd-other';

/** A phone whose profile outlives the browser; `work(context)` with the browser closed behind it. */
export async function withPhone(profile, options, work) {
  const context = await chromium.launchPersistentContext(profile, {
    executablePath: process.env.CHROMIUM,
    args: CHROMIUM_FLAGS,
    ...PHONE,
    ...options,
  });
  try {
    return await work(context);
  } finally {
    await context.close();
  }
}

/** Starts a guest's log and its first outing at a locator: Field then shows a running outing. */
export async function startGuestOuting(page, address) {
  await page.goto(address);
  await page.getByRole('button', { name: 'Start a log on this phone' }).click();
  for (const sign of 'JO46') await page.getByRole('button', { name: sign, exact: true }).click();
  await page.getByRole('button', { name: 'Start the outing' }).click();
  await page.waitForURL('**/field/frequency');
}

/** Waits until each file of the application is on the phone. */
export async function untilInstalled(page, address) {
  await page.goto(`${address}/settings`);
  await page.getByText('Ready without signal.', { exact: true }).waitFor({ timeout: 60_000 });
}
