import { centreOf, squareOf } from '@harkmoor/sync-model/radio/locator/locator';
import { pathBetween } from '@harkmoor/sync-model/radio/path/path';
import { placeFromFix, type ShareCharacters } from '@harkmoor/sync-model/radio/path/shared-path';
import type { Site } from '@harkmoor/sync-model/records/site';
import type { SiteFix } from '@harkmoor/sync-model/records/site-fix';
import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { useLiveQuery } from 'dexie-react-hooks';
import { useActiveLog } from '../../../store/active-log';
import { readClubRecords } from '../../../store/club-records';
import type { WriteStep } from '../../../store/log-writer';
import type { OpenLog } from '../../../store/open-log';

export type OwnFix = SiteFix['fix'];

/** A site with what its owner alone knows of it. */
export type SiteView = {
  readonly log: OpenLog;
  readonly site: StoredRecord<'site'>;
  readonly isOwn: boolean;
  readonly ownFix: StoredRecord<'site-fix'> | null;
  readonly ownerName: string | null;
  readonly isUsed: boolean;
};

/** One site of the shown club; undefined while it is read, null where this phone does not hold it. */
export function useSite(id: string | undefined): SiteView | null | undefined {
  const log = useActiveLog();
  return useLiveQuery(async () => (id === undefined ? null : readSite(log, id)), [log, id]);
}

async function readSite(log: OpenLog, id: string): Promise<SiteView | null> {
  const { database, clubId, myLogId, account } = log;
  const site = await database.recordTable('site').get([clubId, id]);
  if (!site) return null;
  const ownFix = (await database.recordTable('site-fix').get([myLogId, id])) ?? null;
  const owner =
    site.ownerId === null ? undefined : await database.recordTable('member').get([clubId, site.ownerId]);
  const used = await database
    .recordTable('reception')
    .where('[clubId+fields.siteId]')
    .equals([clubId, id])
    .first();
  const outings = used
    ? []
    : (await readClubRecords(log, 'outing')).filter((outing) => outing.fields.siteId === id);
  return {
    log,
    site,
    isOwn: site.ownerId === null || site.ownerId === account?.id,
    ownFix,
    ownerName: owner?.fields.name ?? null,
    isUsed: used !== undefined || outings.length > 0,
  };
}

/** What the form holds: the exact point stays the owner's, `shared` is what all others get. */
export type SiteForm = {
  readonly name: string;
  readonly environment: Site['environment'];
  readonly home: boolean;
  readonly fix: OwnFix | null;
  readonly shared: ShareCharacters | 'exact';
  readonly sharedUse: boolean;
  readonly elevationM: number | null;
  readonly notes: string | null;
};

/** Saves the shared place in the club and the exact fix in My log: both or neither. */
export async function saveSite(
  log: OpenLog,
  id: string | null,
  form: SiteForm & { fix: OwnFix },
): Promise<string> {
  const siteId = id ?? log.writer.newId();
  const site: Site = {
    deleted: false,
    importId: null,
    name: form.name.trim().normalize('NFC'),
    place: placeFromFix(form.fix, form.shared),
    environment: form.environment,
    sharedUse: form.sharedUse,
    notes: form.notes,
    retiredAt: null,
  };
  const fix: SiteFix = {
    deleted: false,
    importId: null,
    fix: form.fix,
    elevationM: form.elevationM,
    home: form.home,
  };
  const hasFix =
    id !== null && (await log.database.recordTable('site-fix').get([log.myLogId, id])) !== undefined;
  const steps: WriteStep[] = [
    id === null
      ? { kind: 'create', type: 'site', id: siteId, fields: site }
      : { kind: 'edit', type: 'site', id: siteId, patch: site },
    hasFix
      ? { kind: 'edit', type: 'site-fix', id: siteId, patch: fix, clubId: log.myLogId }
      : { kind: 'create', type: 'site-fix', id: siteId, fields: fix, clubId: log.myLogId },
  ];
  await log.writer.apply(steps);
  return siteId;
}

/** A typed square as a fix: its centre, good to half its diagonal. */
export function fixFromLocator(locator: string, atMs: number): OwnFix {
  const centre = centreOf(locator);
  const { northDeg, eastDeg } = squareOf(locator);
  const halfKm = pathBetween(centre, { latDeg: northDeg, lonDeg: eastDeg }).distanceKm;
  return {
    ...centre,
    accuracyM: Math.min(100_000, Math.round(halfKm * 1000)),
    source: 'locator',
    fixedAt: atMs,
  };
}

/** Puts a site away: retired once anything refers to it, else to the bin. */
export async function putSiteAway(view: SiteView, nowMs: number): Promise<void> {
  const patch = view.isUsed ? { retiredAt: nowMs } : { deleted: true };
  await view.log.writer.edit('site', view.site.id, patch);
}

export async function takeSiteBack(view: SiteView): Promise<void> {
  await view.log.writer.edit('site', view.site.id, { retiredAt: null, deleted: false });
}

export type SiteRow = {
  readonly id: string;
  readonly site: Site;
  readonly isOwn: boolean;
  readonly ownerName: string | null;
};

/** All sites of the shown club by name, retired ones too. */
export function useSiteRows(): SiteRow[] | undefined {
  const log = useActiveLog();
  return useLiveQuery(async () => {
    const sites = await readClubRecords(log, 'site');
    const members = await readClubRecords(log, 'member');
    const names = new Map(members.map((member) => [member.id, member.fields.name]));
    return sites
      .map(({ id, ownerId, fields }) => ({
        id,
        site: fields,
        isOwn: ownerId === null || ownerId === log.account?.id,
        ownerName: ownerId === null ? null : (names.get(ownerId) ?? 'former member'),
      }))
      .sort((a, b) => a.site.name.localeCompare(b.site.name));
  }, [log]);
}

/** How many entries of the phone stand at each site; for the list. */
export function useSiteCounts(ids: readonly string[]): ReadonlyMap<string, number> {
  const { database, clubId } = useActiveLog();
  const key = ids.join();
  const counts = useLiveQuery(async () => {
    const found = new Map<string, number>();
    for (const id of key === '' ? [] : key.split(',')) {
      const count = await database
        .recordTable('reception')
        .where('[clubId+fields.siteId]')
        .between([clubId, id], [clubId, id], true, true)
        .count();
      found.set(id, count);
    }
    return found;
  }, [database, clubId, key]);
  return counts ?? new Map<string, number>();
}

/** Saves a site in the open log; `id` null makes a new one. */
export function useSaveSite(): (id: string | null, form: SiteForm & { fix: OwnFix }) => Promise<string> {
  const log = useActiveLog();
  return (id, form) => saveSite(log, id, form);
}
