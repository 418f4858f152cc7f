import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import type { RecordType } from '@harkmoor/sync-model/records/record-types';
import { useLiveQuery } from 'dexie-react-hooks';
import { useActiveLog } from './active-log';
import { inClub } from './dexie-store';
import type { OpenLog } from './open-log';

/** All records of one type in a club that are not deleted, by id. For types of which a phone holds few. */
export async function readClubRecords<T extends RecordType>(
  log: OpenLog,
  type: T,
  clubId = log.clubId,
): Promise<StoredRecord<T>[]> {
  const rows = await inClub(log.database, type, clubId).toArray();
  return rows.filter((row) => row.fields.deleted !== true) as unknown as StoredRecord<T>[];
}

/** The same, kept current as the person and the sync write; undefined while it is first read. */
export function useClubRecords<T extends RecordType>(
  type: T,
  clubId?: string,
): StoredRecord<T>[] | undefined {
  const log = useActiveLog();
  const club = clubId ?? log.clubId;
  return useLiveQuery(() => readClubRecords(log, type, club), [log, type, club]);
}

/** One record, deleted ones too; undefined while it is read, null where this phone does not hold it. */
export function useClubRecord<T extends RecordType>(
  type: T,
  id: string | undefined,
  clubId?: string,
): StoredRecord<T> | null | undefined {
  const log = useActiveLog();
  const club = clubId ?? log.clubId;
  return useLiveQuery(
    async () => (id === undefined ? null : ((await log.database.recordTable(type).get([club, id])) ?? null)),
    [log, type, club, id],
  );
}
