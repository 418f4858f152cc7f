import { describe, expect, it } from 'vitest';
import { signIn } from './screens/account';
import * as field from './screens/field';
import { allSent } from './screens/sending';
import { useBrowser } from './stage/browser';
import { MARTHE } from './stage/people';

const PAGES = [
  ['/', 'Field'],
  ['/field', 'Field'],
  ['/field/sites', 'Sites'],
  ['/field/start', 'Start an outing'],
  ['/logbook', 'Logbook'],
  ['/coverage', 'Coverage'],
  ['/coverage/table', 'Coverage as a table'],
  ['/antennas', 'Antennas'],
  ['/events', 'Events'],
  ['/account', 'Account'],
  ['/account/sign-in', 'Sign in'],
  ['/settings', 'Settings'],
  ['/sync', 'Sending'],
  ['/desk/target-lists', 'Target lists'],
] as const;

describe('the installed application without signal', () => {
  const browser = useBrowser();

  it('should open each page by its address and again by a reload, with the records of the club', async () => {
    const phone = await browser.device();
    await signIn(phone, MARTHE);
    await allSent(phone.page);
    await field.installed(phone);
    await phone.setSignal(false);
    for (const [path, title] of PAGES) {
      const heading = phone.page.getByRole('heading', { level: 1, name: title, exact: true });
      await phone.open(path);
      await heading.waitFor();
      await phone.page.reload();
      await heading.waitFor();
    }
    await phone.open('/coverage/table');
    await phone.page.getByRole('cell').first().waitFor();
    expect(await phone.page.getByRole('row').count()).toBeGreaterThan(5);
    await phone.open('/logbook');
    await phone.page
      .getByRole('list', { name: 'Receptions, newest first' })
      .getByRole('link')
      .first()
      .waitFor();
    expect(phone.faults).toEqual([]);
  });
});
