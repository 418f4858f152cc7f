import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { WRITABLE_TYPES } from '@harkmoor/sync-model/records/record-types';
import { useLiveQuery } from 'dexie-react-hooks';
import { useActiveLogState } from './active-log';
import type { HarkmoorDatabase } from './database';

/** How much of a log the server does not have yet, and how much of that waits for a person. */
export type OwedCount = { readonly total: number; readonly refused: number };

const NOTHING: OwedCount = { total: 0, refused: 0 };

/** All records with a debt, over all clubs of the log, oldest first. */
export async function readOwed(database: HarkmoorDatabase): Promise<StoredRecord[]> {
  const found: StoredRecord[] = [];
  for (const type of WRITABLE_TYPES) {
    const rows = await database.recordTable(type).orderBy('[clubId+debt.since]').toArray();
    found.push(...(rows as StoredRecord[]));
  }
  return found.sort((a, b) => a.debt!.since - b.debt!.since);
}

/** Counts without reading the records, so that a lamp over 10 000 unsent entries costs little. */
async function countOwed(database: HarkmoorDatabase): Promise<OwedCount> {
  let total = 0;
  let refused = 0;
  for (const type of WRITABLE_TYPES) {
    const owed = await database.recordTable(type).orderBy('[clubId+debt.since]').count();
    if (owed === 0) continue;
    total += owed;
    refused += await database.recordTable(type).where('debt.status').equals('refused').count();
  }
  return { total, refused };
}

export function useOwedCount(): OwedCount {
  const database = useOpenDatabase();
  return useLiveQuery(async () => (database ? countOwed(database) : NOTHING), [database]) ?? NOTHING;
}

export function useOwedRecords(): StoredRecord[] | undefined {
  const database = useOpenDatabase();
  return useLiveQuery(async () => (database ? readOwed(database) : []), [database]);
}

function useOpenDatabase(): HarkmoorDatabase | null {
  const state = useActiveLogState();
  return state.kind === 'open' ? state.log.database : null;
}
