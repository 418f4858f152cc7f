import { describe, expect, it } from 'vitest';
import { confirmByMail, foundClub, joinClub, signIn, signUp } from './screens/account';
import { openSquare, plain, tableRow, toldByMap } from './screens/coverage';
import * as field from './screens/field';
import { addAntennaSetup, takeAlong } from './screens/gear';
import { allSent, lampText } from './screens/sending';
import { useBrowser, type Device } from './stage/browser';
import { ASTA, stranger } from './stage/people';
import { joinCode, signedInElsewhere } from './stage/server';

const CLUB = 'Heath Walkers';
const SQUARE = 'JO46ac';
/** Never heard, heard by one of two antennas, heard by both: 0, 50 and 100 %. */
const [NEVER, HALF, ALWAYS, ALSO] = [5_000_000, 6_070_000, 7_205_000, 9_420_000];

describe('an outing without signal', () => {
  const browser = useBrowser();

  it('should bring a walker from the sign-up to the club’s map, with the network off in between', async () => {
    const walker = stranger('Ingrid Testmose');
    const phone = await browser.device();
    await signUp(phone, walker);
    await confirmByMail(phone, walker);
    await signIn(phone, walker);
    await foundClub(phone, CLUB);
    await field.installed(phone);

    await phone.setSignal(false);
    await phone.open('/field');
    await field.startFirstOuting(phone.page, SQUARE, 'Wire');
    await firstRoundWithTheWire(phone);
    await mendAnEntry(phone);
    await phone.page.reload(); // still signed in, the outing still runs
    await addAntennaSetup(phone, 'Whip', 'Whip');
    await takeAlong(phone, 'Whip');
    await secondRoundWithTheWhip(phone);
    expect(await lampText(phone.page)).toMatch(/only here/);

    await phone.setSignal(true);
    await allSent(phone.page);

    await othersSeeIt(await browser.device(), walker);
    expect(phone.faults).toEqual([]);
  });

  async function firstRoundWithTheWire({ page }: Device): Promise<void> {
    await field.logHeard(page, { kHz: String(HALF / 1000), scores: '44433' });
    await field.logHeard(page, { kHz: String(ALWAYS / 1000), scores: '55444' });
    await field.logNil(page, String(NEVER / 1000));
    await field.logByChance(page, { kHz: String(HALF / 1000), scores: '33333' });
    await field.logHeard(page, { kHz: String(ALSO / 1000), scores: '2222.' });
  }

  /** The fourth: its overall figure is put right from nothing to 2. */
  async function mendAnEntry({ page }: Device): Promise<void> {
    await field.otherEntry(page, '9420', '2222X').click();
    await field.score(page, '....2');
    await page.getByRole('button', { name: 'Save 22222' }).click();
    await field.otherEntry(page, '9420', '22222').waitFor();
  }

  async function secondRoundWithTheWhip(phone: Device): Promise<void> {
    await field.logNil(phone.page, String(HALF / 1000));
    await field.logNil(phone.page, String(NEVER / 1000));
    await field.enterFrequency(phone.page, String(ALWAYS / 1000));
    await phone.page.getByRole('button', { name: /^Heard, / }).click();
    await field.score(phone.page, '4.4.3');
    await phone.page.waitForTimeout(1000); // a draft is durable 300 ms after a change; the rest is the machine's

    await phone.killTab();
    await phone.open('/field');
    const draft = phone.page.getByRole('group', { name: 'Not saved yet' });
    expect(plain(await draft.innerText())).toContain('7 205 kHz');
    await draft.getByRole('button', { name: 'Continue' }).click();
    await phone.page.getByRole('radio', { name: /^strength 4/, checked: true }).waitFor();
    await phone.page.getByRole('button', { name: 'Save 4X4X3' }).click();
    await field.otherEntry(phone.page, '7205', '4X4X3').waitFor();
  }

  async function othersSeeIt(other: Device, founder: Parameters<typeof signedInElsewhere>[0]): Promise<void> {
    const code = await joinCode(await signedInElsewhere(founder), CLUB);
    await signIn(other, ASTA);
    await joinClub(other, code, CLUB);
    await other.open('/field');
    await allSent(other.page);
    expect(plain(await toldByMap(other, HALF, SQUARE))).toMatch(
      /^JO46ac: 50 % heard, 95 % 9–91, 1 of 2 on 1 date, thin/,
    );
    const rows = [];
    for (const channel of [NEVER, HALF, ALWAYS, ALSO]) {
      const { Heard, Observations } = await tableRow(other, channel, SQUARE);
      rows.push([Heard, Observations]);
    }
    expect(rows).toEqual([
      ['0 %', '2'],
      ['50 %', '2'],
      ['100 %', '2'],
      ['100 %', '1'],
    ]);
    await tableRow(other, HALF, SQUARE);
    await openSquare(other.page, SQUARE);
    await other.page.getByText('1 of 2 · 1 date').waitFor();
    await other.page.locator('summary', { hasText: /chance/ }).waitFor();
    expect(other.faults).toEqual([]);
  }
});
