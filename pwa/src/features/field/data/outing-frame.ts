import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import type { Position } from '@harkmoor/sync-model/radio/position';
import { sharedPosition } from '@harkmoor/sync-model/radio/path/shared-path';
import { inRoundOrder } from '@harkmoor/sync-model/records/round';
import { useLiveQuery } from 'dexie-react-hooks';
import { useActiveLog } from '../../../store/active-log';
import type { OpenLog } from '../../../store/open-log';
import { readGear, setupsOf, type SetupChoice } from './gear';
import type { StoredOuting } from './running-outing';

export type StoredTarget = StoredRecord<'target'>;

/** What stands around the entries of an outing: its place, its gear, its list. */
export type OutingFrame = {
  site: StoredRecord<'site'> | null;
  /** The owner's exact fix where this phone holds one, else the shared place: for distances on this screen only. */
  position: Position | null;
  setups: SetupChoice[];
  list: StoredRecord<'target-list'> | null;
  /** In the order of the round. */
  targets: StoredTarget[];
};

export async function readOutingFrame(log: OpenLog, outing: StoredOuting): Promise<OutingFrame> {
  const { database, clubId, myLogId } = log;
  const { siteId, setupIds, targetListId } = outing.fields;
  const site = (await database.recordTable('site').get([clubId, siteId])) ?? null;
  const fix = await database.recordTable('site-fix').get([myLogId, siteId]);
  const list = targetListId
    ? ((await database.recordTable('target-list').get([clubId, targetListId])) ?? null)
    : null;
  const targets = targetListId
    ? await database
        .recordTable('target')
        .where('[clubId+fields.listId]')
        .equals([clubId, targetListId])
        .toArray()
    : [];
  const setups = setupsOf(await readGear(log), setupIds);
  const exact = fix && !fix.fields.deleted ? fix.fields.fix : null;
  return {
    site,
    position: exact ?? (site ? sharedPosition(site.fields.place) : null),
    setups,
    list,
    targets: inRoundOrder(targets.filter((target) => !target.fields.deleted)),
  };
}

export function useOutingFrame(outing: StoredOuting): OutingFrame | undefined {
  const log = useActiveLog();
  return useLiveQuery(() => readOutingFrame(log, outing), [log, outing]);
}
