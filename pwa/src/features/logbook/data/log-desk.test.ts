// @vitest-environment jsdom
import { Dexie } from 'dexie';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { OpenLog } from '../../../store/open-log';
import { aReception, openTestAccountLog, TEST_IDS } from '../../../store/test-log';
import { WHOLE_LOG, type LogFilter } from '../index/log-filter';
import type { LogDesk } from './desk-messages';
import { openLogDesk } from './log-desk';

let log: OpenLog;
let desk: LogDesk;
let changes = 0;

const START = Date.UTC(2026, 10, 12, 18);
const nowMs = START + 86_400_000;

function openDesk(): void {
  const { database, clubId, account } = log;
  const address = { databaseName: database.name, clubId, region: 1 as const, ownId: account!.id };
  desk = openLogDesk(address, () => (changes += 1));
}

async function view(filter: Partial<LogFilter> = {}) {
  return desk.ask({ type: 'view', filter: { ...WHOLE_LOG, ...filter }, nowMs });
}

/** Asks again until it is so: the log is read, and read on, in its own time. */
async function until(isSo: () => Promise<boolean>): Promise<void> {
  const endMs = Date.now() + 10_000;
  while (!(await isSo())) {
    if (Date.now() > endMs) throw new Error('it never came to be so');
    await new Promise((resolve) => setTimeout(resolve, 10));
  }
}

beforeEach(async () => {
  log = await openTestAccountLog();
  changes = 0;
});

afterEach(async () => {
  desk.close();
  log.database.close();
  for (const name of await Dexie.getDatabaseNames()) await Dexie.delete(name);
});

const entries = (count: number) =>
  Array.from({ length: count }, (_, number) => ({
    kind: 'create' as const,
    type: 'reception' as const,
    fields: aReception({ deviceAt: START + number * 1000, stationName: `Station ${number}` }),
  }));

describe('the list of a log', () => {
  it('should read all of a long log, and give any window of it in order', async () => {
    await log.writer.apply(entries(2500));
    openDesk();
    expect((await view()).shownCount).toBeGreaterThan(100);
    await until(async () => (await view()).isComplete);
    const { viewId, shownCount, ofCount } = await view();
    expect([shownCount, ofCount]).toEqual([2500, 2500]);
    const window = await desk.ask({ type: 'rows', viewId, from: 2498, to: 2600 });
    expect(window?.rows.map(({ station }) => station)).toEqual(['Station 1', 'Station 0']);
  });

  it('should follow a save, an edit and a deletion', async () => {
    const [first] = await log.writer.apply(entries(2));
    openDesk();
    await until(async () => (await view()).shownCount === 2);
    await log.writer.create('reception', aReception({ deviceAt: START + 60_000 }));
    await until(async () => (await view()).shownCount === 3);
    await log.writer.edit('reception', first!.id, { remarks: 'deep fading' });
    await until(async () => (await view({ search: 'deep' })).shownCount === 1);
    await log.writer.edit('reception', first!.id, { deleted: true });
    await until(async () => (await view()).shownCount === 2);
    expect((await view({ bin: true })).shownCount).toBe(1);
    expect(changes).toBeGreaterThan(0);
  });

  it('should follow a write of many at once', async () => {
    openDesk();
    await until(async () => (await view()).isComplete);
    const rows = (await log.writer.apply(entries(3))).map((row, number) => ({
      ...row,
      id: `${row.id}-${number}`,
    }));
    const many = Array.from({ length: 80 }, (_, number) => ({
      ...rows[0]!,
      id: log.writer.newId(),
      seq: number,
    }));
    await log.database.recordTable('reception').bulkPut(many as never);
    await until(async () => (await view()).shownCount === 83);
  });

  it('should read a renamed site and a clash without reading the log again', async () => {
    const { id } = await log.writer.create('reception', aReception());
    openDesk();
    await until(async () => (await view()).isComplete);
    await log.database.recordTable('history').put({
      ...{ clubId: TEST_IDS.club, type: 'history', id: 'h1', ownerId: null, seq: 9, at: '' },
      fields: {
        ...{ deleted: false, recordType: 'reception', recordId: id, field: 'remarks', byId: '', clash: true },
        ...{ replaced: { value: null, stamp: '' }, kept: { value: 'x', stamp: '' } },
      },
    });
    await until(async () => {
      const { viewId } = await view();
      const window = await desk.ask({ type: 'rows', viewId, from: 0, to: 1 });
      return window?.rows[0]?.isClash === true;
    });
  });

  it('should only note what is written while nobody looks, and read it at the next look', async () => {
    openDesk();
    await until(async () => (await view()).isComplete);
    desk.watch(false);
    await log.writer.create('reception', aReception());
    await new Promise((resolve) => setTimeout(resolve, 150));
    expect((await view()).shownCount).toBe(0);
    desk.watch(true);
    await until(async () => (await view()).shownCount === 1);
  });

  it('should give no rows of a view that a newer one has replaced', async () => {
    await log.writer.apply(entries(1));
    openDesk();
    const old = await view();
    await view();
    expect(await desk.ask({ type: 'rows', viewId: old.viewId, from: 0, to: 9 })).toBeNull();
  });

  it('should offer what the log holds to choose from', async () => {
    await log.writer.apply(entries(1));
    openDesk();
    const choices = await desk.ask({ type: 'choices' });
    expect(choices.bands).toEqual([{ value: '49 m broadcast', label: '49 m broadcast' }]);
    expect(choices.operators).toEqual([{ value: 'own', label: 'Me' }]);
    expect(choices.stations.map(({ label }) => label)).toEqual(['Station 0']);
  });
});
