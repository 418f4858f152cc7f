import { defaultShareCharacters, placeFromFix } from '@harkmoor/sync-model/radio/path/shared-path';
import { pathBetween } from '@harkmoor/sync-model/radio/path/path';
import { centreOf, coarser, squareOf } from '@harkmoor/sync-model/radio/locator/locator';
import type { Antenna } from '@harkmoor/sync-model/records/antenna';
import {
  plainAntenna,
  plainReceiver,
  plainSetup,
  plainSite,
} from '@harkmoor/sync-model/records/gear-defaults';
import type { SiteFix } from '@harkmoor/sync-model/records/site-fix';
import type { Place, Site } from '@harkmoor/sync-model/records/site';
import type { WriteStep } from '../../../store/log-writer';
import type { OpenLog } from '../../../store/open-log';
import { startOuting } from './outing-writer';

/** Where a first outing is: a reading of the device, or a locator as it was typed. */
export type QuickPlace =
  { kind: 'fix'; fix: SiteFix['fix'] } | { kind: 'locator'; locator: string; atMs: number };

/** Everything that a first outing needs, in one form; all of it can be edited later. */
export type QuickStart = {
  siteName: string;
  environment: Site['environment'];
  place: QuickPlace;
  receiverName: string;
  antennaName: string;
  antennaKind: Antenna['kind'];
  /** A setup that is there already; null where receiver and antenna are to be made. */
  setupId: string | null;
};

/** What others will see: the square by default for such surroundings, never finer than what was typed. */
export function sharedPlaceOf(place: QuickPlace, environment: Site['environment']): Place {
  const characters = defaultShareCharacters({ home: false, environment });
  if (place.kind === 'fix') return placeFromFix(place.fix, characters);
  return { locator: coarser(place.locator, characters) };
}

/** The owner's own fix: the reading, or the centre of the typed square with half its diagonal as accuracy. */
function exactFixOf(place: QuickPlace): SiteFix['fix'] {
  if (place.kind === 'fix') return place.fix;
  const centre = centreOf(place.locator);
  const { northDeg, eastDeg } = squareOf(place.locator);
  const halfKm = pathBetween(centre, { latDeg: northDeg, lonDeg: eastDeg }).distanceKm;
  const accuracyM = Math.min(100_000, Math.round(halfKm * 1000));
  return { ...centre, accuracyM, source: 'locator', fixedAt: place.atMs };
}

/** Makes the site, and gear where there is none, and starts the outing with them: all of it or nothing. */
export async function quickStart(log: OpenLog, form: QuickStart, nowMs: number): Promise<string> {
  const siteId = log.writer.newId();
  const gear = form.setupId === null ? newGear(log, form) : { setupId: form.setupId, steps: [] };
  const site = plainSite(form.siteName, sharedPlaceOf(form.place, form.environment), form.environment);
  const fix = { deleted: false, importId: null, fix: exactFixOf(form.place), elevationM: null, home: false };
  const steps: WriteStep[] = [
    { kind: 'create', type: 'site', id: siteId, fields: site },
    // the exact fix never leaves the person's own log, whatever club the site is in
    { kind: 'create', type: 'site-fix', id: siteId, fields: fix, clubId: log.myLogId },
    ...gear.steps,
  ];
  const start = { siteId, setupIds: [gear.setupId], currentSetupId: gear.setupId, targetListId: null };
  return startOuting(log, start, nowMs, steps);
}

function newGear(log: OpenLog, form: QuickStart): { setupId: string; steps: WriteStep[] } {
  const receiverId = log.writer.newId();
  const antennaId = log.writer.newId();
  const setupId = log.writer.newId();
  return {
    setupId,
    steps: [
      { kind: 'create', type: 'receiver', id: receiverId, fields: plainReceiver(form.receiverName) },
      {
        kind: 'create',
        type: 'antenna',
        id: antennaId,
        fields: plainAntenna(form.antennaName, form.antennaKind),
      },
      { kind: 'create', type: 'setup', id: setupId, fields: plainSetup(receiverId, antennaId) },
    ],
  };
}
