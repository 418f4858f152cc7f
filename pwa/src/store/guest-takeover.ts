import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { WRITABLE_TYPES } from '@harkmoor/sync-model/records/record-types';
import { Dexie } from 'dexie';
import type { Draft } from './draft';
import { GUEST_DATABASE_NAME, HarkmoorDatabase } from './database';
import type { OpenLog } from './open-log';

/** How many receptions the log that was started on this phone without an account holds. */
export async function countGuestReceptions(): Promise<number> {
  if (!(await Dexie.exists(GUEST_DATABASE_NAME))) return 0;
  const guest = new HarkmoorDatabase(GUEST_DATABASE_NAME);
  try {
    return await guest.recordTable('reception').count();
  } finally {
    guest.close();
  }
}

/**
 * Takes the guest's log into the account's My log. Ids and stamps stay, so a second run after a crash adds
 * nothing; the guest's database goes only once everything stands in the account's.
 */
export async function takeOverGuestLog(log: OpenLog): Promise<number> {
  if (!log.account || !(await Dexie.exists(GUEST_DATABASE_NAME))) return 0;
  const guest = new HarkmoorDatabase(GUEST_DATABASE_NAME);
  const taken: StoredRecord[] = [];
  for (const type of WRITABLE_TYPES) {
    const rows = await guest.recordTable(type).toArray();
    taken.push(...rows.map((row) => ownedCopy(row as StoredRecord, log.myLogId, log.account!.id)));
  }
  const drafts = (await guest.drafts.toArray()).map((draft) => ({ ...draft, clubId: log.myLogId }));
  await writeWhereAbsent(log, taken, drafts);
  await guest.delete();
  return taken.filter((record) => record.type === 'reception').length;
}

function ownedCopy(record: StoredRecord, clubId: string, ownerId: string): StoredRecord {
  return { ...record, clubId, ownerId, seq: 0 };
}

async function writeWhereAbsent(
  log: OpenLog,
  records: readonly StoredRecord[],
  drafts: readonly Draft[],
): Promise<void> {
  const { database } = log;
  const tables = [...WRITABLE_TYPES.map((type) => database.recordTable(type)), database.drafts];
  await database.transaction('rw', tables, async () => {
    for (const record of records) {
      const table = database.recordTable(record.type);
      const known = await table.get([record.clubId, record.id]);
      if (!known) await table.add(record as never);
    }
    await database.drafts.bulkPut(drafts);
  });
}
