import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { useLiveQuery } from 'dexie-react-hooks';
import { useActiveLog } from '../../../store/active-log';
import type { OpenLog } from '../../../store/open-log';

export type StoredReception = StoredRecord<'reception'>;

/** The entries of one outing in the order in which they were made, binned ones too. */
export async function readEntries(log: OpenLog, outingId: string): Promise<StoredReception[]> {
  const entries = await log.database
    .recordTable('reception')
    .where('[clubId+fields.outingId]')
    .equals([log.clubId, outingId])
    .toArray();
  return entries.sort((a, b) => (a.id < b.id ? -1 : 1));
}

/** Live, and limited to the outing: what else is in the log costs nothing here. */
export function useOutingEntries(outingId: string): StoredReception[] | undefined {
  const log = useActiveLog();
  return useLiveQuery(() => readEntries(log, outingId), [log, outingId]);
}
