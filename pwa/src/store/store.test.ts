// @vitest-environment jsdom
import 'fake-indexeddb/auto';
import { Dexie } from 'dexie';
import { afterEach, describe, expect, it } from 'vitest';
import { readClubRecords } from './club-records';
import { createDexieStore } from './dexie-store';
import { countGuestReceptions, takeOverGuestLog } from './guest-takeover';
import { SETTING, type OpenLog } from './open-log';
import { aReception, aSite, openTestAccountLog, openTestGuestLog, TEST_IDS } from './test-log';

const opened: OpenLog[] = [];
const remember = (log: OpenLog) => {
  opened.push(log);
  return log;
};

afterEach(async () => {
  for (const log of opened.splice(0)) log.database.close();
  for (const name of await Dexie.getDatabaseNames()) await Dexie.delete(name);
});

describe('the log writer', () => {
  it('should owe every field of a new record and keep the debt in its row', async () => {
    const log = remember(await openTestAccountLog());
    const { id } = await log.writer.create('reception', aReception());
    const [owed] = await createDexieStore(log.database).transaction((tx) => tx.owed(TEST_IDS.club));
    expect(owed?.id).toBe(id);
    expect(Object.keys(owed!.debt!.fields).sort()).toEqual(Object.keys(aReception()).sort());
  });

  it('should store all steps of a write or none', async () => {
    const log = remember(await openTestAccountLog());
    const missing = log.writer.newId();
    await expect(
      log.writer.apply([
        { kind: 'create', type: 'site', fields: aSite() },
        { kind: 'edit', type: 'reception', id: missing, patch: { remarks: 'x' } },
      ]),
    ).rejects.toThrow('no reception');
    expect(await readClubRecords(log, 'site')).toEqual([]);
  });

  it('should refuse to write into a club that has left the phone', async () => {
    const log = remember(await openTestAccountLog());
    await createDexieStore(log.database).transaction((tx) => tx.removeClub(TEST_IDS.club));
    await expect(log.writer.create('site', aSite())).rejects.toThrow('no longer on this phone');
    expect(await log.database.recordTable('site').count()).toBe(0);
  });

  it('should stamp an edit after the value it replaces although the clock went back', async () => {
    const log = remember(await openTestAccountLog());
    await log.database.settings.put({ name: SETTING.clockOffsetMs, value: 3_600_000 });
    const made = await log.writer.create('reception', aReception());
    await log.database.settings.put({ name: SETTING.clockOffsetMs, value: -3_600_000 });
    const edited = await log.writer.edit('reception', made.id, { remarks: 'fading' });
    expect((edited.stamps?.remarks ?? '') > made.at).toBe(true);
  });
});

describe('the phone’s store', () => {
  it('should leave nothing of a transaction that fails', async () => {
    const log = remember(await openTestAccountLog());
    const site = await log.writer.create('site', aSite());
    const store = createDexieStore(log.database);
    await expect(
      store.transaction(async (tx) => {
        await tx.putRecords([{ ...site, seq: 7, debt: undefined } as never]);
        await tx.putSetting('cursor-test', 1);
        throw new Error('killed');
      }),
    ).rejects.toThrow('killed');
    const [kept, setting] = await store.transaction(async (tx) => [
      (await tx.records([{ clubId: TEST_IDS.club, type: 'site', id: site.id }]))[0]?.seq,
      await tx.setting('cursor-test'),
    ]);
    expect([kept, setting]).toEqual([0, undefined]);
  });

  it('should take out one club and leave the other', async () => {
    const log = remember(await openTestAccountLog());
    await log.writer.create('site', aSite());
    await log.writer.create('site', aSite(), { clubId: TEST_IDS.myLog });
    await createDexieStore(log.database).transaction((tx) => tx.removeClub(TEST_IDS.club));
    expect(await readClubRecords(log, 'site', TEST_IDS.club)).toHaveLength(0);
    expect(await readClubRecords(log, 'site', TEST_IDS.myLog)).toHaveLength(1);
    expect((await log.reload()).clubId).toBe(TEST_IDS.myLog);
  });
});

describe('a guest’s log taken over', () => {
  it('should keep ids, owe everything to My log, and leave no guest behind', async () => {
    const guest = remember(await openTestGuestLog());
    const site = await guest.writer.create('site', aSite());
    const reception = await guest.writer.create('reception', aReception({ siteId: site.id }));
    guest.database.close();
    expect(await countGuestReceptions()).toBe(1);

    const log = remember(await openTestAccountLog());
    expect(await takeOverGuestLog(log)).toBe(1);
    const [taken] = await readClubRecords(log, 'reception', TEST_IDS.myLog);
    expect(taken).toMatchObject({ id: reception.id, ownerId: TEST_IDS.account, seq: 0, at: reception.at });
    expect(taken!.debt!.status).toBe('waiting');
    expect(await countGuestReceptions()).toBe(0);
    expect(await takeOverGuestLog(log)).toBe(0);
  });
});
