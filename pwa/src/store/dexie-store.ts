import type { ClubState, RecordKey, Store, StoreTransaction } from '@harkmoor/sync-model/device/ports';
import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { SERVER_TYPES, WRITABLE_TYPES, type RecordType } from '@harkmoor/sync-model/records/record-types';
import { Dexie } from 'dexie';
import type { HarkmoorDatabase, StoredKey } from './database';

const ALL_TYPES: readonly RecordType[] = [...WRITABLE_TYPES, ...SERVER_TYPES];

/** The device half's Store over Dexie: one strictly durable transaction over all tables. */
export function createDexieStore(database: HarkmoorDatabase): Store {
  const tables = [...ALL_TYPES.map((type) => database.recordTable(type)), database.clubs, database.settings];
  const tx = createTransaction(database);
  return {
    // the scope must be an async function itself: Dexie follows native awaits only in one that it sees as such
    transaction: (work) => database.transaction('rw', tables, async () => work(tx)),
  };
}

function createTransaction(database: HarkmoorDatabase): StoreTransaction {
  return {
    clubs: () => database.clubs.toArray(),
    putClub: async (club: ClubState) => {
      await database.clubs.put(club);
    },
    removeClub: async (clubId) => {
      for (const type of ALL_TYPES) await inClub(database, type, clubId).delete();
      await database.clubs.delete(clubId);
    },
    records: (keys) => readRecords(database, keys),
    putRecords: async (records) => {
      for (const [type, rows] of groupByType(records)) await database.recordTable(type).bulkPut(rows);
    },
    owed: async (clubId) => {
      const owed: StoredRecord[] = [];
      for (const type of WRITABLE_TYPES) owed.push(...(await owedOfType(database, type, clubId)));
      return owed.sort((a, b) => a.debt!.since - b.debt!.since);
    },
    setting: async <T>(name: string) => (await database.settings.get(name))?.value as T | undefined,
    putSetting: async (name, value) => {
      await database.settings.put({ name, value });
    },
  };
}

async function readRecords(
  database: HarkmoorDatabase,
  keys: readonly RecordKey[],
): Promise<(StoredRecord | undefined)[]> {
  const found: (StoredRecord | undefined)[] = new Array(keys.length).fill(undefined);
  const positions = new Map<RecordType, number[]>();
  keys.forEach((key, position) => {
    const places = positions.get(key.type);
    if (places) places.push(position);
    else positions.set(key.type, [position]);
  });
  for (const [type, places] of positions) {
    const rows = await database
      .recordTable(type)
      .bulkGet(places.map((place): StoredKey => [keys[place]!.clubId, keys[place]!.id]));
    places.forEach((place, i) => (found[place] = rows[i]));
  }
  return found;
}

function groupByType(records: readonly StoredRecord[]): Map<RecordType, StoredRecord[]> {
  const groups = new Map<RecordType, StoredRecord[]>();
  for (const record of records) {
    const group = groups.get(record.type);
    if (group) group.push(record);
    else groups.set(record.type, [record]);
  }
  return groups;
}

export function inClub(database: HarkmoorDatabase, type: RecordType, clubId: string) {
  return database
    .recordTable(type)
    .where('[clubId+id]')
    .between([clubId, Dexie.minKey], [clubId, Dexie.maxKey]);
}

export async function owedOfType(
  database: HarkmoorDatabase,
  type: RecordType,
  clubId: string,
): Promise<StoredRecord[]> {
  return database
    .recordTable(type)
    .where('[clubId+debt.since]')
    .between([clubId, Dexie.minKey], [clubId, Dexie.maxKey])
    .toArray();
}
