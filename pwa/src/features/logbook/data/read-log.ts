import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { Dexie } from 'dexie';
import type { HarkmoorDatabase, StoredKey } from '../../../store/database';
import { inClub } from '../../../store/dexie-store';

export type StoredReception = StoredRecord<'reception'>;

/** Rows a transaction: a save that waits behind one waits for some milliseconds, not for the whole log. */
const CHUNK_ROWS = 1000;

/** The newest receptions by the device's time, enough for the first screen. */
export async function readNewest(
  database: HarkmoorDatabase,
  clubId: string,
  rowsMax: number,
): Promise<StoredReception[]> {
  const rows = await database
    .recordTable('reception')
    .where('[clubId+fields.deviceAt]')
    .between([clubId, Dexie.minKey], [clubId, Dexie.maxKey])
    .reverse()
    .limit(rowsMax)
    .toArray();
  return rows as StoredReception[];
}

/** The ids of a club's receptions in their order, deleted ones too: a key is read in a hundredth of a row's time. */
export async function readIds(database: HarkmoorDatabase, clubId: string): Promise<string[]> {
  const keys = (await inClub(database, 'reception', clubId).primaryKeys()) as unknown as StoredKey[];
  return keys.map(([, id]) => id);
}

/**
 * Hands over all receptions in chunks, those with the latest ids first: ids begin with the time at which they were
 * made, so that the newest entries are there at once.
 */
export async function readAll(
  { database, clubId }: { database: HarkmoorDatabase; clubId: string },
  ids: readonly string[],
  take: (rows: readonly StoredReception[]) => void,
): Promise<void> {
  const table = database.recordTable('reception');
  for (let end = ids.length; end > 0; end -= CHUNK_ROWS) {
    const first = ids[Math.max(0, end - CHUNK_ROWS)]!;
    const last = ids[end - 1]!;
    const rows = await table
      .where('[clubId+id]')
      .between([clubId, first], [clubId, last], true, true)
      .toArray();
    take(rows as StoredReception[]);
  }
}

/** The receptions of these ids; undefined for one that is no longer there. */
export async function readSome(
  database: HarkmoorDatabase,
  clubId: string,
  ids: readonly string[],
): Promise<(StoredReception | undefined)[]> {
  const keys = ids.map((id): StoredKey => [clubId, id]);
  return (await database.recordTable('reception').bulkGet(keys)) as (StoredReception | undefined)[];
}
