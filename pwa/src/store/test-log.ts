import type { Reception } from '@harkmoor/sync-model/records/reception';
import type { Site } from '@harkmoor/sync-model/records/site';
import { openAccountLog, openGuestLog, type KnownClub, type OpenLog } from './open-log';

/** Real logs over the test's IndexedDB, and fields to fill them; for tests alone. */
export const TEST_IDS = {
  account: '0190a000-0000-7000-8000-00000000000a',
  myLog: '0190a000-0000-7000-8000-00000000000b',
  club: '0190a000-0000-7000-8000-00000000000c',
  site: '0190a000-0000-7000-8000-00000000000d',
  setup: '0190a000-0000-7000-8000-00000000000e',
};

const CLUBS: KnownClub[] = [
  {
    clubId: TEST_IDS.myLog,
    role: 'admin',
    card: { name: 'My log', kind: 'my-log', ituRegion: 1, demo: false },
  },
  {
    clubId: TEST_IDS.club,
    role: 'member',
    card: { name: 'Heath circle', kind: 'club', ituRegion: 1, demo: false },
  },
];

export async function openTestAccountLog(): Promise<OpenLog> {
  const account = { id: TEST_IDS.account, name: 'Ida Test', email: 'ida@harkmoor.invalid', confirmed: true };
  const log = await openAccountLog(account.id, { account, clubs: CLUBS });
  if (!log) throw new Error('a told account must open');
  return log;
}

export { openGuestLog as openTestGuestLog };

export function aSite(over: Partial<Site> = {}): Site {
  return {
    deleted: false,
    importId: null,
    name: 'Ravnklit dune',
    place: { locator: 'JO46ac' },
    environment: 'rural',
    sharedUse: false,
    notes: null,
    retiredAt: null,
    ...over,
  };
}

export function aReception(over: Partial<Reception> = {}): Reception {
  return {
    deleted: false,
    importId: null,
    outingId: null,
    siteId: TEST_IDS.site,
    setupId: TEST_IDS.setup,
    targetId: null,
    targetHz: null,
    eventId: null,
    swap: null,
    roundNo: null,
    outcome: 'heard',
    basis: 'planned',
    identity: 'sure',
    nilReason: null,
    deviceAt: Date.UTC(2026, 10, 12, 18, 43),
    durationS: null,
    tuning: { dialHz: 6_070_000, mode: 'AM' },
    bandwidthHz: null,
    attenuationDb: null,
    sinpo: { s: 4, i: 4, n: 3, p: 3, o: 3 },
    rst: null,
    meter: null,
    noiseMeter: null,
    carried: null,
    programme: null,
    remarks: null,
    stationName: null,
    heardBy: null,
    ...over,
  };
}
