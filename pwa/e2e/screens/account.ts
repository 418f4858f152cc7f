import type { Page } from 'playwright-core';
import { mailedLink } from '../stage/mail';
import type { Device } from '../stage/browser';
import type { Person } from '../stage/people';

export async function signUp({ page, open }: Device, { name, email, password }: Person): Promise<void> {
  await open('/account/sign-up');
  await fill(page, { Name: name, 'Mail address': email, Password: password });
  await press(page, 'Make the account');
  await page.getByText('A mail is on its way').waitFor();
}

export async function confirmByMail({ page, open }: Device, { email }: Person): Promise<void> {
  await open(await mailedLink(email, /confirm/i));
  await press(page, 'Confirm the address');
  await page.getByText('The address is confirmed.').waitFor();
}

export async function signIn({ page, open }: Device, { email, password }: Person): Promise<void> {
  await open('/account/sign-in');
  await fill(page, { 'Mail address': email, Password: password });
  await press(page, 'Sign in');
  await page.waitForURL('**/field');
}

export async function foundClub({ page, open }: Device, name: string): Promise<void> {
  await open('/account/clubs');
  await page.getByRole('textbox', { name: 'Name of the club' }).fill(name);
  await press(page, 'Found the club');
  await page.getByText(`You are an admin of ${name}.`).waitFor();
}

export async function joinClub({ page, open }: Device, code: string, name: string): Promise<void> {
  await open('/account/clubs');
  await page.getByRole('textbox', { name: 'Code' }).fill(code);
  await press(page, 'Join');
  await page.getByText(`You are a member of ${name}.`).waitFor();
}

/** Shows another club of the account, as known on the device. */
export async function showClub({ page, open }: Device, label: string): Promise<void> {
  await open('/account');
  await page.getByRole('radio', { name: label }).check({ force: true });
  await page.getByRole('radio', { name: label, checked: true }).waitFor();
}

async function fill(page: Page, values: Readonly<Record<string, string>>): Promise<void> {
  for (const [name, value] of Object.entries(values)) {
    await page.getByRole('textbox', { name, exact: true }).fill(value);
  }
}

async function press(page: Page, name: string): Promise<void> {
  await page.getByRole('button', { name, exact: true }).click();
}
