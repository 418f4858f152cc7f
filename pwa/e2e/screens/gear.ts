import type { Page } from 'playwright-core';
import type { Device } from '../stage/browser';
import { goTo } from './field';

/** Adds an antenna and puts it on the receiver that there is, as a setup. */
export async function addAntennaSetup({ page }: Device, name: string, kind: string): Promise<void> {
  await goTo(page, 'Antennas');
  await page.getByRole('link', { name: 'Add an antenna' }).click();
  await page.getByRole('textbox', { name: 'Name' }).fill(name);
  await page.getByRole('combobox', { name: 'Kind' }).selectOption({ label: kind });
  await save(page);
  await page.getByRole('link', { name: 'Add a setup' }).click();
  await page.getByRole('combobox', { name: 'Antenna' }).selectOption({ label: name });
  await save(page);
}

/** In a running outing: takes one more setup along and listens with it from now. */
export async function takeAlong({ page }: Device, antenna: string): Promise<void> {
  await goTo(page, 'Field');
  await page.getByRole('button', { name: 'Setups: add or mend' }).click();
  await page.getByRole('button', { name: new RegExp(`^${antenna}( · |$)`) }).click();
  await page.getByRole('radio', { name: antenna, checked: true }).waitFor();
}

async function save(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Save', exact: true }).click();
  await page.getByRole('heading', { name: 'Antennas', level: 1 }).waitFor();
}
