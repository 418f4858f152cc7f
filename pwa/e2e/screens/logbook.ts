import type { Page } from 'playwright-core';
import type { Device } from '../stage/browser';
import { plain } from './coverage';

/** The rows of the logbook, newest first, each as one line of text. */
export async function logRows({ page, open }: Device, count: number): Promise<string[]> {
  await open('/logbook');
  const rows = page.getByRole('list', { name: 'Receptions, newest first' }).getByRole('link');
  await rows.nth(count - 1).waitFor();
  return (await rows.allInnerTexts()).map((text) => plain(text.replace(/\s*\n\s*/g, ' ')));
}

/** Opens the newest reception. */
export async function openNewest({ page, open }: Device): Promise<void> {
  await open('/logbook');
  await page.getByRole('list', { name: 'Receptions, newest first' }).getByRole('link').first().click();
  await page.getByRole('heading', { name: 'Changes' }).waitFor();
}

/** On the page of a reception: opens the pad, changes texts in it, saves. */
export async function editTexts(
  page: Page,
  texts: { readonly remark?: string; readonly station?: string },
): Promise<void> {
  await page.getByRole('link', { name: 'Edit' }).click();
  if (texts.remark !== undefined) await fillPart(page, 'Remark', 'Remark', texts.remark);
  if (texts.station !== undefined) await fillPart(page, 'Station', 'Station heard', texts.station);
  await page.getByRole('button', { name: /^Save/ }).click();
  await page.getByRole('heading', { name: 'Changes' }).waitFor();
}

async function fillPart(page: Page, part: string, label: string, text: string): Promise<void> {
  const field = page.getByRole('textbox', { name: label });
  const opener = page.getByRole('button', { name: new RegExp(`^${part} [+−]$`) });
  await opener.waitFor();
  if (!(await field.isVisible())) await opener.click();
  await field.fill(text);
}
