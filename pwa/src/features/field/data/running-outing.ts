import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { Dexie } from 'dexie';
import { useLiveQuery } from 'dexie-react-hooks';
import { useActiveLog } from '../../../store/active-log';
import { readSetting, type OpenLog } from '../../../store/open-log';
import { FIELD_SETTING } from './field-settings';

export type StoredOuting = StoredRecord<'outing'>;

/** How far back an outing that another device of this person began is looked for. */
const SEARCH_BACK_MS = 62 * 86_400_000;

/** The person's outings of this club: the one that runs, if any, and the newest one, for its site and setups. */
export type OwnOutings = { running: StoredOuting | null; newest: StoredOuting | null };

export async function readOwnOutings(log: OpenLog, nowMs: number): Promise<OwnOutings> {
  const table = log.database.recordTable('outing');
  const known = await readSetting<string>(log.database, FIELD_SETTING.lastOutingId(log.clubId));
  const recent = await table
    .where('[clubId+fields.startedAt]')
    .between([log.clubId, nowMs - SEARCH_BACK_MS], [log.clubId, Dexie.maxKey])
    .toArray();
  // the outing begun on this phone may be older than the search: it must not run on unseen
  const begunHere = known ? await table.get([log.clubId, known]) : undefined;
  const own = [...recent, ...(begunHere ? [begunHere] : [])]
    .filter((outing) => outing.ownerId === (log.account?.id ?? null) && !outing.fields.deleted)
    .sort((a, b) => b.fields.startedAt - a.fields.startedAt || (a.id < b.id ? 1 : -1));
  return { running: own.find((outing) => !outing.fields.ended) ?? null, newest: own[0] ?? null };
}

/** Live: changes as an outing starts or ends, here or on another device of this person. Undefined while it is read. */
export function useOwnOutings(): OwnOutings | undefined {
  const log = useActiveLog();
  return useLiveQuery(() => readOwnOutings(log, Date.now()), [log]);
}
