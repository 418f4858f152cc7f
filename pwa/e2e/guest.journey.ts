import { describe, expect, it } from 'vitest';
import { signIn, signUp } from './screens/account';
import * as field from './screens/field';
import { logRows } from './screens/logbook';
import { allSent } from './screens/sending';
import { useBrowser, type Device } from './stage/browser';
import { stranger } from './stage/people';
import { countTaps, tapsSoFar } from './stage/taps';

const TAPS_MAX = 12;
const FIRST_RECEPTION_WITHIN_MS = 60_000;

describe('a guest', () => {
  const browser = useBrowser();

  it('should log a first reception with no network in a minute and 12 taps, and take it along at a sign-in', async () => {
    const phone = await browser.device();
    await field.installed(phone);
    await phone.setSignal(false);
    await countTaps(phone);

    const startedMs = performance.now();
    await phone.open('/');
    await firstReception(phone);
    expect(performance.now() - startedMs).toBeLessThan(FIRST_RECEPTION_WITHIN_MS);
    expect(await tapsSoFar(phone)).toBeLessThanOrEqual(TAPS_MAX);
    await phone.page.getByRole('link', { name: /on this phone only$/ }).waitFor();
    expect(await logRows(phone, 1)).toEqual([expect.stringMatching(/^6 070 kHz .*Only here$/)]);

    await phone.setSignal(true);
    const walker = stranger('Frode Testmose');
    await signUp(phone, walker);
    await signIn(phone, walker);
    await allSent(phone.page);
    await phone.open('/logbook');
    await phone.page.getByRole('link', { name: /6\s?070.*Sent$/ }).waitFor();
    expect(phone.faults).toEqual([]);

    const laptop = await browser.device();
    await signIn(laptop, walker);
    await allSent(laptop.page);
    expect(await logRows(laptop, 1)).toEqual([expect.stringMatching(/^6 070 kHz /)]);
    await laptop.open('/account');
    await laptop.page.getByText('My log is yours alone; nobody else sees it.').waitFor();
  });

  /** 1 + 4 + 1 to a running outing, 4 + 1 to the pad, 1 to save. */
  async function firstReception({ page }: Device): Promise<void> {
    const tap = (role: 'button', name: string | RegExp): Promise<void> =>
      page.getByRole(role, { name, exact: typeof name === 'string' }).tap();
    await tap('button', 'Start a log on this phone');
    for (const sign of 'JO46') await tap('button', sign);
    await tap('button', 'Start the outing');
    for (const figure of '6070') await tap('button', figure);
    await tap('button', /^Heard, /);
    await tap('button', /^Save/);
    await field.otherEntry(page, '6070', 'Heard').waitFor();
  }
});
