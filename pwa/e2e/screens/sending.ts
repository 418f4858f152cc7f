import type { Page } from 'playwright-core';

/** The lamp says that everything is at the server. */
export async function allSent(page: Page, withinMs = 60_000): Promise<void> {
  await page
    .getByRole('link', { name: /^Sent / })
    .first()
    .waitFor({ timeout: withinMs });
}

/** The lamp's line. */
export async function lampText(page: Page): Promise<string> {
  return (await page.locator('a.lamp:visible').first().innerText()).trim();
}
