import type { Place } from '@harkmoor/sync-model/records/site';
import { useLiveQuery } from 'dexie-react-hooks';
import { useActiveLog } from '../../../store/active-log';
import { readClubRecords } from '../../../store/club-records';

export type SiteOption = { id: string; name: string; place: Place; isOwn: boolean };

/** Sites that an outing may start at: own ones first, then those that are shared; none retired. */
export function useSites(): SiteOption[] | undefined {
  const log = useActiveLog();
  return useLiveQuery(async () => {
    const ownId = log.account?.id ?? null;
    const sites = await readClubRecords(log, 'site');
    return sites
      .filter(({ fields, ownerId }) => fields.retiredAt === null && (ownerId === ownId || fields.sharedUse))
      .map(({ id, fields, ownerId }) => ({
        id,
        name: fields.name,
        place: fields.place,
        isOwn: ownerId === ownId,
      }))
      .sort((a, b) => Number(b.isOwn) - Number(a.isOwn) || (a.name < b.name ? -1 : 1));
  }, [log]);
}
