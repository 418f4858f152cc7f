import { describe, expect, it } from 'vitest';
import type { Locator, Page } from 'playwright-core';
import { signIn, signUp } from './screens/account';
import * as field from './screens/field';
import { useBrowser, type Device } from './stage/browser';
import { stranger } from './stage/people';

declare global {
  var harmDone: boolean | undefined;
}

const SCRIPT = '<img src=x onerror="globalThis.harmDone=true"><script>harmDone=true</script>';
const TOO_LONG = 'm'.repeat(61);

describe('a form given bad input', () => {
  const browser = useBrowser();

  it('should say beside each field of an account what is wrong, and make none', async () => {
    const laptop = await browser.device({ screen: 'laptop' });
    const { page } = laptop;
    await laptop.open('/account/sign-up');
    await press(page, 'Make the account');
    await says(page, 'Name', 'Write a name');
    await says(page, 'Mail address', /Write a mail address/);
    await says(page, 'Password', /at least 10 characters/);
    await typeAnyway(page, 'Name', TOO_LONG);
    await typeAnyway(page, 'Mail address', 'no address');
    await typeAnyway(page, 'Password', 'p'.repeat(129));
    await press(page, 'Make the account');
    await says(page, 'Name', /at most 60/);
    await says(page, 'Mail address', /Write a mail address/);
    await says(page, 'Password', /at most 128/);

    await laptop.open('/account/sign-in');
    await press(page, 'Sign in');
    await says(page, 'Password', 'Write your password');
    await typeAnyway(page, 'Mail address', 'nobody@walkers.invalid');
    await typeAnyway(page, 'Password', SCRIPT);
    await press(page, 'Sign in');
    await page.getByRole('alert').filter({ hasText: /\w/ }).first().waitFor();
    expect(new URL(page.url()).pathname).toBe('/account/sign-in');
    await noHarm(laptop);
  });

  it('should refuse a club without a name or with a wrong code, and take script text as text', async () => {
    const founder = stranger('Kirsten Testmose');
    const laptop = await browser.device({ screen: 'laptop' });
    const { page } = laptop;
    await signUp(laptop, founder);
    await signIn(laptop, founder);
    await laptop.open('/account/clubs');
    await press(page, 'Found the club');
    await says(page, 'Name of the club', 'Write a name');
    await typeAnyway(page, 'Name of the club', TOO_LONG);
    await press(page, 'Found the club');
    await says(page, 'Name of the club', /at most 60/);
    await press(page, 'Join');
    await says(page, 'Code', /Write the code/);
    await typeAnyway(page, 'Code', SCRIPT);
    await press(page, 'Join');
    await says(page, 'Code', 'A code has 10 letters and figures');
    await typeAnyway(page, 'Code', 'AAAAA-AAAAA');
    await press(page, 'Join');
    await page.getByRole('alert').filter({ hasText: /code/i }).first().waitFor();
    await laptop.open('/account');
    await page.getByText('My log is yours alone').waitFor();
    expect(await page.getByRole('radio').count()).toBe(1);
    await noHarm(laptop);
  });

  it('should refuse gear and sites that the records would not hold, and keep none of them', async () => {
    const phone = await browser.device();
    const { page } = phone;
    await startAsGuest(phone);
    await phone.open('/antennas/antennas/new');
    await press(page, 'Save');
    await says(page, 'Name', /\w/);
    await typeAnyway(page, 'Name', TOO_LONG);
    await typeAnyway(page, 'Length', '5001');
    await typeAnyway(page, 'Height above ground', 'high');
    await typeAnyway(page, 'Direction, true', '-1');
    await press(page, 'Save');
    for (const name of ['Name', 'Length', 'Height above ground', 'Direction, true'])
      await says(page, name, /\w/);
    await phone.open('/antennas/receivers/new');
    await press(page, 'Save');
    await says(page, 'Name', /\w/);
    await phone.open('/field/sites/new');
    await press(page, 'Save');
    await says(page, 'Name', /\w/);
    await page
      .getByText(/Set the point/)
      .first()
      .waitFor();
    await phone.open('/antennas');
    await page.getByText('No gear yet').waitFor();
    await noHarm(phone);
  });

  it('should keep script text of a log as the text it is', async () => {
    const phone = await browser.device();
    const { page } = phone;
    await startAsGuest(phone);
    await page.getByRole('textbox', { name: 'Name of the place' }).fill(SCRIPT.slice(0, 60));
    await page.getByRole('textbox', { name: 'Receiver' }).fill(SCRIPT.slice(0, 60));
    await field.startFirstOuting(page, 'JO46');
    await field.enterFrequency(page, SCRIPT);
    expect(await page.getByRole('button', { name: /^Heard, / }).isEnabled()).toBe(false);
    await field.enterFrequency(page, '6070');
    await page.getByRole('button', { name: /^Heard, / }).click();
    await page.getByRole('button', { name: 'Remark +' }).click();
    await page.getByRole('textbox', { name: 'Remark' }).fill(SCRIPT);
    await page.getByRole('button', { name: 'Station +' }).click();
    await page.getByRole('textbox', { name: 'Station heard' }).fill(SCRIPT);
    await field.savePad(page);
    await phone.open('/logbook');
    await page.getByRole('link', { name: /<img src=x/ }).click();
    await page.getByText(SCRIPT, { exact: true }).first().waitFor();
    for (const path of ['/antennas', '/field/sites', '/coverage', '/coverage/table']) {
      await phone.open(path);
      await page.getByRole('heading', { level: 1 }).first().waitFor();
      await noHarm(phone);
    }
  });

  async function startAsGuest(phone: Device): Promise<void> {
    await phone.open('/');
    await press(phone.page, 'Start a log on this phone');
    await phone.page.getByRole('heading', { name: 'Start listening' }).waitFor();
  }

  /** A field that may stay empty says so in its label. */
  function boxOf(page: Page, label: string): Locator {
    return page.getByRole('textbox', { name: new RegExp(`^${label}( optional)?$`) });
  }

  async function press(page: Page, name: string): Promise<void> {
    await page.getByRole('button', { name, exact: true }).click();
  }

  /** Past what the field itself allows, as a paste by a broken keyboard or an older browser may. */
  async function typeAnyway(page: Page, label: string, text: string): Promise<void> {
    const box = boxOf(page, label);
    await box.evaluate((input) => input.removeAttribute('maxlength'));
    await box.fill(text);
  }

  /** The field is marked as wrong and its description says what to do. */
  async function says(page: Page, label: string, what: string | RegExp): Promise<void> {
    const box = boxOf(page, label);
    await page.locator('[aria-invalid="true"]').and(box).waitFor();
    const ids = ((await box.getAttribute('aria-describedby')) ?? '')
      .split(' ')
      .filter((id) => id.endsWith('-error'));
    const told = await page.locator(`[id="${ids[0] ?? ''}"]`).innerText();
    expect(told).toMatch(what);
  }

  async function noHarm({ page, faults }: Device): Promise<void> {
    expect(await page.evaluate(() => globalThis.harmDone)).toBeUndefined();
    expect(faults).toEqual([]);
  }
});
