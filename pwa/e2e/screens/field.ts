import type { Locator, Page } from 'playwright-core';
import type { Device } from '../stage/browser';

/** Waits until Settings says that the whole application is on the device. */
export async function installed({ page, open }: Device): Promise<void> {
  await open('/settings');
  await page.getByText('Ready without signal.', { exact: true }).waitFor({ timeout: 60_000 });
}

/** The tab at the foot of the phone. */
export async function goTo(
  page: Page,
  section: 'Field' | 'Logbook' | 'Coverage' | 'Antennas',
): Promise<void> {
  await page.getByRole('navigation', { name: 'Sections' }).getByRole('link', { name: section }).click();
}

/** Types a locator by its own keys, one tap a sign. */
export async function typeLocator(page: Page, locator: string): Promise<void> {
  for (const sign of locator) await page.getByRole('button', { name: sign, exact: true }).click();
}

/** So long a second answer is taken for a trembling thumb. */
const SECOND_TAP_MS = 1_600;

export type Entry = { readonly kHz: string; readonly scores?: string };

/** Opens *Other frequency* where it is not open yet, and types one. */
export async function enterFrequency(page: Page, kHz: string): Promise<void> {
  if (new URL(page.url()).pathname !== '/field/frequency') {
    await page.getByRole('link', { name: 'Other frequency, kHz' }).click();
  }
  await page.getByRole('textbox', { name: /^Frequency in kHz/ }).fill(kHz);
}

/** Starts the first outing of an empty log with a locator; leads to the entry of a frequency. */
export async function startFirstOuting(page: Page, locator: string, antenna = 'Whip'): Promise<void> {
  await typeLocator(page, locator);
  await page.getByRole('radio', { name: antenna }).check({ force: true });
  await page.getByRole('button', { name: 'Start the outing' }).click();
  await page.waitForURL('**/field/frequency');
}

/** A planned try that was heard, scored, and saved. */
export async function logHeard(page: Page, { kHz, scores = '' }: Entry): Promise<void> {
  await enterFrequency(page, kHz);
  await page.getByRole('button', { name: /^Heard, / }).click();
  await score(page, scores);
  await savePad(page);
}

export async function logNil(page: Page, kHz: string): Promise<void> {
  await enterFrequency(page, kHz);
  await page.getByRole('button', { name: /^Nil, / }).click();
  await fieldIsBack(page);
  await page.waitForTimeout(SECOND_TAP_MS); // nobody types the next one faster
}

export async function logByChance(page: Page, { kHz, scores = '' }: Entry): Promise<void> {
  await enterFrequency(page, kHz);
  await page.getByRole('button', { name: /^By chance, / }).click();
  await score(page, scores);
  await savePad(page);
}

const COLUMNS = ['strength', 'interference', 'noise', 'propagation', 'overall'];

/** Touches the cells of a SINPO like "44433"; a point leaves a column alone. */
export async function score(page: Page, figures: string): Promise<void> {
  for (const [index, figure] of [...figures].entries()) {
    if (figure === '.') continue;
    const column = page.getByRole('radiogroup', { name: COLUMNS[index] ?? '', exact: true });
    await column.getByRole('radio', { name: new RegExp(` ${figure},`) }).click();
  }
}

export async function savePad(page: Page): Promise<void> {
  await page.getByRole('button', { name: /^Save/ }).click();
  await fieldIsBack(page);
}

async function fieldIsBack(page: Page): Promise<void> {
  await page.getByRole('link', { name: 'Other frequency, kHz' }).waitFor();
}

/** An entry in Field's list of what was entered beside the rounds: "9420" with its outcome, such as "22222" or "Nil". */
export function otherEntry(page: Page, kHz: string, outcome: string): Locator {
  const figure = kHz.replace(/(\d)(\d{3})$/, '$1\\s$2');
  return page.getByRole('button', { name: new RegExp(`^${figure}\\skHz.*\\b${outcome}\\b.*Edit$`) });
}
