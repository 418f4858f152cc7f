import { describe, expect, it } from 'vitest';
import { signIn, signUp } from './screens/account';
import * as field from './screens/field';
import { editTexts, openNewest } from './screens/logbook';
import { allSent } from './screens/sending';
import { useBrowser, type Device } from './stage/browser';
import { stranger } from './stage/people';
import { storedStamp } from './stage/stored-stamps';

const MINUTE_MS = 60_000;
const TEN_YEARS_MS = 10 * 365.25 * 24 * 60 * MINUTE_MS;

describe('two phones of one account with wrong clocks', () => {
  const browser = useBrowser();

  it('should keep both edits of different fields, and of one field the later stamp, with the other to put back', async () => {
    const walker = stranger('Solveig Testmose');
    const fast = await browser.device({ clockAheadMs: 3 * MINUTE_MS });
    const far = await browser.device({ clockAheadMs: TEN_YEARS_MS });
    await signUp(fast, walker);
    await signIn(fast, walker);
    await logOne(fast);
    await allSent(fast.page);
    await signIn(far, walker);
    await allSent(far.page);
    for (const phone of [fast, far]) await field.installed(phone);

    await apart([fast, far]);
    await editTexts(fast.page, { remark: 'Clear above the surf' });
    await editTexts(far.page, { station: 'Radio Tangvig' });
    await together([fast, far]);
    for (const phone of [fast, far]) await shows(phone, ['Clear above the surf', 'Radio Tangvig']);

    await apart([fast, far]);
    await editTexts(fast.page, { remark: 'Written at the three-minute phone' });
    await editTexts(far.page, { remark: 'Written at the ten-year phone' });
    const [ofFast, ofFar] = [await storedStamp(fast, 'remarks'), await storedStamp(far, 'remarks')];
    await together([fast, far]);
    const remarks = { fast: 'Written at the three-minute phone', far: 'Written at the ten-year phone' };
    const [won, lost] = ofFar > ofFast ? [remarks.far, remarks.fast] : [remarks.fast, remarks.far];
    for (const phone of [fast, far]) await shows(phone, [won]);

    await fast.page.getByRole('button', { name: `Put back Remarks: “${lost}”` }).click();
    await shows(fast, [lost]);
    await together([fast, far]);
    for (const phone of [fast, far]) await shows(phone, [lost]);
    expect([...fast.faults, ...far.faults]).toEqual([]);
  });

  async function logOne(phone: Device): Promise<void> {
    await field.startFirstOuting(phone.page, 'JO46');
    await field.logHeard(phone.page, { kHz: '6070', scores: '44444' });
  }

  /** Both have the reception open and no signal. */
  async function apart(phones: readonly Device[]): Promise<void> {
    for (const phone of phones) await openNewest(phone);
    for (const phone of phones) await phone.setSignal(false);
  }

  /** Signal again: each sends, then each receives what the other sent; both have the reception open. */
  async function together(phones: readonly Device[]): Promise<void> {
    for (const phone of phones) await phone.setSignal(true);
    for (const phone of [...phones, ...phones]) {
      await phone.open('/field');
      await allSent(phone.page);
    }
    for (const phone of phones) await openNewest(phone);
  }

  async function shows({ page }: Device, texts: readonly string[]): Promise<void> {
    const main = page.locator('.ion-page:not(.ion-page-hidden)').last();
    for (const text of texts) await main.getByText(text, { exact: true }).first().waitFor();
  }
});
