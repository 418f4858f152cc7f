import { v7 } from 'uuid';
import type { Change } from '@harkmoor/sync-model/protocol/messages';
import type { WritableType } from '@harkmoor/sync-model/records/record-types';
import { formatStamp } from '@harkmoor/sync-model/stamp/stamp';

const START_MS = Date.UTC(2026, 9, 1, 18);
const REMARKS = [
  'Fading, readable in the peaks.',
  'Strong but a whistle above.',
  'Voice, then music.',
  'Weak under noise.',
];

/** The parents of `receptions`, in the order of sending. */
export function parents(): Change[] {
  const site = record('site', {
    name: 'Ravnklit dune',
    place: { locator: 'JO45fk' },
    environment: 'rural',
    sharedUse: true,
  });
  const meterScale = { kind: 's', s9Dbm: -73, dbPerS: 6, calibrated: false };
  const receiver = record('receiver', { name: 'Grey portable', ranges: [], meterScale, sharedUse: false });
  const antenna = record('antenna', { name: 'Long wire', kind: 'wire', sharedUse: false });
  const setup = record('setup', {
    receiverId: receiver.id,
    antennaId: antenna.id,
    attenuationDb: 0,
    preampDb: 0,
  });
  const outing = record('outing', {
    siteId: site.id,
    startedAt: START_MS,
    setupIds: [setup.id],
    currentSetupId: setup.id,
    clockSteps: [],
  });
  return [site, receiver, antenna, setup, outing];
}

/** Receptions as a phone would send them after a season offline: mostly heard with scores, some nil. */
export function receptions(count: number, [site, , , setup, outing]: readonly Change[]): Change[] {
  return Array.from({ length: count }, (_, index) => {
    const isHeard = index % 3 !== 0;
    return record(
      'reception',
      {
        outingId: outing!.id,
        siteId: site!.id,
        setupId: setup!.id,
        roundNo: 1 + (index % 999),
        outcome: isHeard ? 'heard' : 'nil',
        basis: 'round',
        identity: 'sure',
        deviceAt: START_MS + index * 20_000,
        tuning: { dialHz: 5_900_000 + (index % 60) * 5000, mode: 'AM' },
        ...(isHeard ? heard(index) : { nilReason: 'nothing' }),
      },
      index,
    );
  });
}

function heard(index: number): Record<string, unknown> {
  const grade = 1 + (index % 5);
  return {
    sinpo: { s: grade, i: 4, n: 3, p: 3, o: grade },
    meter: { s: index % 10, overDb: 0 },
    stationName: `Channel ${index % 60}`,
    remarks: REMARKS[index % REMARKS.length],
  };
}

function record(type: WritableType, fields: Record<string, unknown>, index = 0): Change {
  const at = formatStamp({ wallMs: START_MS + index * 20_000, counter: 0, deviceId: 'benchone' });
  return { type, id: v7(), at, fields: { deleted: false, ...fields } };
}
