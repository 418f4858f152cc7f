import type { Page } from 'playwright-core';
import type { Device } from '../stage/browser';

/** What the map tells of a square of one channel when the cursor stands on it; the address chooses the channel. */
export async function toldByMap({ page, open }: Device, channelHz: number, square: string): Promise<string> {
  await open(`/coverage?channel=${channelHz}`);
  const map = page.getByRole('application', { name: 'Map of coverage' });
  await map.focus();
  await page.keyboard.press('Home');
  const told = page.getByRole('status').filter({ hasText: `${square}` });
  await told.first().waitFor();
  return (await told.first().textContent()) ?? '';
}

/** The row of a square in the plain table, by its column headers. */
export async function tableRow(
  { page, open }: Device,
  channelHz: number,
  square: string,
): Promise<Record<string, string>> {
  await open(`/coverage/table?channel=${channelHz}`);
  const row = page.getByRole('row').filter({ has: page.getByRole('link', { name: square }) });
  await row.waitFor();
  const headers = await page.getByRole('columnheader').allInnerTexts();
  const cells = await row.getByRole('cell').allInnerTexts();
  return Object.fromEntries(
    headers.map((header, index) => [header.replace(/ [↕↑↓]$/, ''), plain(cells[index] ?? '')]),
  );
}

/** Thin and no-break spaces as plain ones. */
export function plain(text: string): string {
  return text.replace(/[\u202f\u2009\u00a0]/g, ' ').trim();
}

export async function openSquare(page: Page, square: string): Promise<void> {
  await page.getByRole('link', { name: square }).click();
  await page.getByRole('heading', { name: `Square ${square}`, level: 1 }).waitFor();
}
