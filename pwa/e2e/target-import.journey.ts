import fs from 'node:fs';
import path from 'node:path';
import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { plain } from './screens/coverage';
import * as field from './screens/field';
import { useBrowser, type Device } from './stage/browser';
import { temporaryFolder } from './stage/temporary-folder';

const FAULTY = `Wave;Who;Kind;Opens;Closes
6070;Radio Tangvig;AM;04:00;20:00
49m;Lyngbakke Coast;AM;;
7205;;AM;;
9420;Voice of Estavara;morse;;
5000;Tone Service Nordsund;AM;25:00;26:00
`;
const SOUND = FAULTY.replace('49m', '5910')
  .replace('7205;;', '7205;Radio Hvidklit;')
  .replace('morse', 'CW')
  .replace('25:00;26:00', '05:00;06:00');

describe('the import of a target list', () => {
  const browser = useBrowser();
  const folder = temporaryFolder();

  it('should name each fault by row and column, keep nothing of a faulty file, and lead a round by a sound one', async () => {
    const phone = await browser.device();
    const { page } = phone;
    await phone.open('/');
    await page.getByRole('button', { name: 'Start a log on this phone' }).click();
    await page.getByRole('heading', { name: 'Start listening' }).waitFor();
    await newList(phone, 'Heath list');

    await chooseFile(page, FAULTY);
    const told = (await page.getByRole('alert').getByRole('listitem').allInnerTexts()).map(plain);
    expect(told).toHaveLength(5);
    expect(told).toEqual(
      expect.arrayContaining([
        expect.stringMatching(/^Row 3, Frequency.*metre band/),
        expect.stringMatching(/^Row 4, Name: /),
        expect.stringMatching(/^Row 5, Mode: “morse” is none of/),
        expect.stringMatching(/^Row 6, On air from, UTC: /),
        expect.stringMatching(/^Row 6, On air to, UTC: /),
      ]),
    );
    expect(await page.getByRole('button', { name: /^Nothing is imported/ }).isEnabled()).toBe(false);
    await page.getByRole('link', { name: /^Back to/ }).click();
    await page.getByText('No targets yet').waitFor();

    await chooseFile(page, SOUND);
    await page.getByRole('button', { name: 'Import 5 targets' }).click();
    await page.getByRole('button', { name: 'Lyngbakke Coast' }).waitFor();

    await phone.open('/field');
    await field.startFirstOuting(page, 'JO46');
    await phone.open('/field');
    await page.getByRole('button', { name: /^Heath list · 5 targets/ }).click();
    await page.getByRole('heading', { name: /^Round 1 · Heath list/ }).waitFor();
    await page.getByRole('button', { name: 'Nil, 5910 kilohertz, Lyngbakke Coast' }).click();
    await page.getByText('1 of 5').waitFor();
    expect(phone.faults).toEqual([]);
  });

  async function newList({ page, open }: Device, name: string): Promise<void> {
    await open('/desk/target-lists');
    await page.getByRole('button', { name: 'Add a list' }).first().click();
    await page.getByRole('textbox', { name: 'Name' }).fill(name);
    await page.getByRole('button', { name: 'Make the list' }).click();
    await page.getByText('No targets yet').waitFor();
  }

  async function chooseFile(page: Page, text: string): Promise<void> {
    const file = path.join(folder(), 'targets.csv');
    fs.writeFileSync(file, text);
    await page.getByRole('link', { name: 'Import from CSV' }).click();
    await page.getByLabel('CSV file of targets').setInputFiles(file);
    const columns = {
      Wave: 'Frequency, kHz (or with MHz)',
      Who: 'Name',
      Kind: 'Mode',
      Opens: 'On air from, UTC',
      Closes: 'On air to, UTC',
    };
    for (const [header, label] of Object.entries(columns)) {
      await page.getByRole('combobox', { name: header }).selectOption({ label });
    }
  }
});
