import fs from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { signIn, signUp } from './screens/account';
import * as field from './screens/field';
import { logRows } from './screens/logbook';
import { allSent } from './screens/sending';
import { useBrowser, type Device } from './stage/browser';
import { stranger } from './stage/people';
import { temporaryFolder } from './stage/temporary-folder';

describe('unsent records as a file', () => {
  const browser = useBrowser();
  const folder = temporaryFolder();

  it('should carry an entry from a phone without signal to another device, and never twice', async () => {
    const walker = stranger('Mogens Testmose');
    const phone = await browser.device();
    await signUp(phone, walker);
    await signIn(phone, walker);
    await allSent(phone.page);
    await field.installed(phone);
    await phone.setSignal(false);
    await phone.open('/field');
    await field.startFirstOuting(phone.page, 'JO46');
    await field.logHeard(phone.page, { kHz: '6070', scores: '44444' });
    const file = await keepFile(phone, path.join(folder(), 'unsent.json'));

    const other = await browser.device();
    await signIn(other, walker);
    await allSent(other.page);
    await refuseBroken(other, folder());
    await readIn(other, file, /^\d+ records read in; 0 were on this phone already\.$/);
    await readIn(other, file, /^0 records read in; \d+ were on this phone already\.$/);
    await other.open('/field');
    await allSent(other.page);
    expect(await logRows(other, 1)).toEqual([expect.stringContaining('44444')]);

    await phone.setSignal(true);
    await phone.open('/field');
    await allSent(phone.page);
    expect(await logRows(phone, 1)).toHaveLength(1);
    expect([...phone.faults, ...other.faults]).toEqual([]);
  });

  async function keepFile({ page, open }: Device, to: string): Promise<string> {
    await open('/sync');
    const download = page.waitForEvent('download');
    await page.getByRole('button', { name: 'Keep unsent records as a file' }).click();
    await (await download).saveAs(to);
    await page.getByText(/records are in harkmoor-unsent-\d{4}-\d\d-\d\d\.json/).waitFor();
    return to;
  }

  async function readIn({ page, open }: Device, file: string, told: RegExp): Promise<void> {
    await open('/sync');
    await page.getByLabel('File of unsent records').setInputFiles(file);
    await page.getByText(told).waitFor();
  }

  async function refuseBroken(device: Device, into: string): Promise<void> {
    const broken = path.join(into, 'broken.json');
    fs.writeFileSync(broken, '{ "format": "harkmoor-unsent", "version": 1, "records": [ {} ] }');
    await readIn(device, broken, /Record 1 of the file is broken; nothing was read in\./);
    fs.writeFileSync(broken, 'a shopping list');
    await readIn(device, broken, /cannot be read as JSON/);
  }
});
