import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { WRITABLE_TYPES } from '@harkmoor/sync-model/records/record-types';
import { useLiveQuery } from 'dexie-react-hooks';
import { useActiveLogState } from '../../../store/active-log';
import type { HarkmoorDatabase } from '../../../store/database';

export type Owed = { readonly count: number; readonly refused: number };

/** How many records are only here, over all clubs of the open log, and how many of them need attention. */
export function useOwed(): Owed {
  const state = useActiveLogState();
  const database = state.kind === 'open' ? state.log.database : null;
  return useLiveQuery(async () => (database ? countOwed(database) : NOTHING), [database]) ?? NOTHING;
}

const NOTHING: Owed = { count: 0, refused: 0 };

async function countOwed(database: HarkmoorDatabase): Promise<Owed> {
  const rows = await readOwed(database);
  return { count: rows.length, refused: rows.filter((row) => row.debt?.status === 'refused').length };
}

/** All records with a debt, oldest first. */
export async function readOwed(database: HarkmoorDatabase): Promise<StoredRecord[]> {
  const found: StoredRecord[] = [];
  for (const type of WRITABLE_TYPES) {
    found.push(
      ...((await database.recordTable(type).orderBy('[clubId+debt.since]').toArray()) as StoredRecord[]),
    );
  }
  return found.sort((a, b) => a.debt!.since - b.debt!.since);
}

export function useOwedRecords(): StoredRecord[] | undefined {
  const state = useActiveLogState();
  const database = state.kind === 'open' ? state.log.database : null;
  return useLiveQuery(async () => (database ? readOwed(database) : []), [database]);
}
