// @vitest-environment jsdom
import 'fake-indexeddb/auto';
import { Dexie } from 'dexie';
import { afterEach, describe, expect, it } from 'vitest';
import type { OpenLog } from '../../../store/open-log';
import { readOwed } from '../../../store/owed';
import { aReception, aSite, openTestAccountLog, TEST_IDS } from '../../../store/test-log';
import { readInUnsentFile, unsentFile } from './unsent-file';

let log: OpenLog;
afterEach(async () => {
  log.database.close();
  for (const name of await Dexie.getDatabaseNames()) await Dexie.delete(name);
});

/** The same account on a phone that holds nothing yet. */
async function otherPhone(): Promise<OpenLog> {
  log.database.close();
  for (const name of await Dexie.getDatabaseNames()) await Dexie.delete(name);
  log = await openTestAccountLog();
  return log;
}

async function fileOfOneEvening(): Promise<string> {
  log = await openTestAccountLog();
  const site = await log.writer.create('site', aSite());
  await log.writer.create('reception', aReception({ siteId: site.id }));
  return (await unsentFile(log, Date.UTC(2026, 11, 1))).text;
}

describe('a file of unsent records', () => {
  it('should bring every record to another phone of the account, and nothing twice', async () => {
    const text = await fileOfOneEvening();
    const phone = await otherPhone();
    expect(await readInUnsentFile(phone, text)).toEqual({ kind: 'read', added: 2, known: 0 });
    expect(await readInUnsentFile(phone, text)).toEqual({ kind: 'read', added: 0, known: 2 });
    expect((await readOwed(phone.database)).map((record) => record.ownerId)).toEqual([
      TEST_IDS.account,
      TEST_IDS.account,
    ]);
  });

  type Broken = (record: Record<string, Record<string, unknown>>) => void;
  it.each<[string, Broken]>([
    ['a field of the wrong type', (record) => (record.fields!.deviceAt = 'yesterday')],
    ['a missing field', (record) => delete record.fields!.tuning],
    ['a field that no record has', (record) => (record.fields!.owner = 'me')],
    ['a stamp that is none', (record) => Object.assign(record, { at: '<script>' })],
    ['no debt', (record) => delete record.debt],
    ['a type that no phone writes', (record) => Object.assign(record, { type: 'member' })],
  ])('should change nothing for one record with %s', async (_what, spoil) => {
    const file = JSON.parse(await fileOfOneEvening()) as {
      records: Record<string, Record<string, unknown>>[];
    };
    spoil(file.records.find((record) => (record.type as unknown) === 'reception')!);
    const phone = await otherPhone();
    const read = await readInUnsentFile(phone, JSON.stringify(file));
    expect(read).toMatchObject({ kind: 'refused', message: expect.stringContaining('broken') });
    expect(await readOwed(phone.database)).toEqual([]);
  });

  it.each([
    '',
    'null',
    '[]',
    '{"format":"harkmoor-unsent","version":9}',
    '{"format":"harkmoor-unsent","version":1}',
  ])('should say why it cannot read %j', async (text) => {
    log = await openTestAccountLog();
    expect((await readInUnsentFile(log, text)).kind).toBe('refused');
  });

  it('should not open to another account', async () => {
    const file = JSON.parse(await fileOfOneEvening()) as { accountId: string };
    const text = JSON.stringify({ ...file, accountId: '0190a000-0000-7000-8000-0000000000ff' });
    expect(await readInUnsentFile(await otherPhone(), text)).toMatchObject({
      message: expect.stringContaining('another account'),
    });
  });
});
