import { v7 } from 'uuid';
import type { Change } from '@harkmoor/sync-model/protocol/messages';
import type { WritableType } from '@harkmoor/sync-model/records/record-types';
import { EVENING_MS, stampAt } from './hub.js';

type Fields = Record<string, unknown>;
const AT = EVENING_MS;

/** A whole record as a phone first sends it: empty fields are left out. */
export function newRecord(type: WritableType, fields: Fields, at = stampAt(AT), id = v7()): Change {
  return { type, id, at, fields: { deleted: false, ...fields } };
}

/** A later edit of some fields by a phone that knew their stamps. */
export function edit(record: Change, fields: Fields, at: string, base = record.at): Change {
  const bases = Object.fromEntries(Object.keys(fields).map((field) => [field, base]));
  return { type: record.type, id: record.id, at, fields, base: bases };
}

export type Sample = Readonly<Record<WritableType, Change>>;

/** One record of each type, each field filled, with parents among themselves; in the order of sending. */
export function sampleOfEachType(): Sample {
  const site = newRecord('site', {
    name: 'Ravnklit dune',
    place: { locator: 'JO45fk' },
    environment: 'quiet-rural',
    sharedUse: true,
    notes: 'The path is soft.\nNo mains within 2 km – “quiet”.',
    retiredAt: AT,
  });
  const receiver = newRecord('receiver', {
    name: 'Grey portable',
    ranges: [{ lowHz: 150_000, highHz: 30_000_000 }],
    meterScale: { kind: 's', s9Dbm: -73, dbPerS: 6, calibrated: false },
    ifHz: [55_845_000, 455_000],
    bandwidthsHz: [2500, 4000, 6000],
    supplyMa: 85.5,
    batteryMah: 2000,
    dialStepHz: 10,
    sharedUse: false,
    replaces: v7(),
    notes: 'ø',
    retiredAt: AT,
  });
  const antenna = newRecord('antenna', {
    name: 'Long wire',
    kind: 'wire',
    lengthM: 20.5,
    heightM: 2.5,
    azimuthDeg: 270,
    gainDb: -3.5,
    sharedUse: false,
    replaces: v7(),
    notes: 'Thin.',
    retiredAt: AT,
  });
  const setup = newRecord('setup', {
    receiverId: receiver.id,
    antennaId: antenna.id,
    coupling: '9:1',
    attenuationDb: 10,
    preampDb: 0,
    retiredAt: AT,
  });
  const list = newRecord('target-list', {
    name: 'Evening round',
    edition: 'B26',
    validFrom: AT,
    validTo: AT + 1,
  });
  const target = newRecord('target', {
    listId: list.id,
    name: 'Channel 292',
    frequencyHz: 6_070_000,
    mode: 'AM',
    schedule: [{ from: '19:00', to: '21:00', days: [1, 7], validFrom: AT }],
    silences: [{ from: AT, to: AT + 1000 }],
    tx: { latDeg: 48.5, lonDeg: 11.25 },
    powerKw: 10,
    language: 'various',
    note: 'Weak in winter.',
  });
  const outing = newRecord('outing', {
    siteId: site.id,
    startedAt: AT,
    ended: { at: AT + 3_600_000, by: 'hand' },
    targetListId: list.id,
    setupIds: [setup.id],
    currentSetupId: setup.id,
    eventId: v7(),
    clockSteps: [{ at: AT, stepMs: -1200 }],
    notes: 'Windy.',
  });
  const swapTest = newRecord('swap-test', {
    outingId: outing.id,
    setupIds: [setup.id, setup.id],
    targetId: target.id,
    frequencyHz: 6_070_000,
    measure: 'over-noise',
    pairsPlanned: 16,
    gapLimitS: 60,
    dwellS: 10,
    seed: 4_294_967_295,
    ended: { at: AT, reason: 'done' },
  });
  const reception = newRecord('reception', receptionFields({ outing, site, setup, target, swapTest }));
  return {
    site,
    'site-fix': newRecord('site-fix', siteFixFields(55.4501, 8.4501), undefined, site.id),
    receiver,
    antenna,
    setup,
    'target-list': list,
    target,
    outing,
    'swap-test': swapTest,
    reception,
    ...samplesBeside({ receiver, site, setup, reception }),
  };
}

export function siteFixFields(latDeg: number, lonDeg: number): Fields {
  const fix = { latDeg, lonDeg, accuracyM: 6.5, source: 'averaged', fixedAt: AT, averagedS: 60 };
  return { fix, elevationM: 12.5, home: false };
}

function receptionFields(
  parents: Record<'outing' | 'site' | 'setup' | 'target' | 'swapTest', Change>,
): Fields {
  return {
    outingId: parents.outing.id,
    siteId: parents.site.id,
    setupId: parents.setup.id,
    targetId: parents.target.id,
    targetHz: 6_070_000,
    eventId: v7(),
    swap: { testId: parents.swapTest.id, pairNo: 1, arm: 0, order: 1, spoilt: true },
    roundNo: 1,
    outcome: 'heard',
    basis: 'round',
    identity: 'sure',
    nilReason: 'noise',
    deviceAt: AT + 60_000,
    durationS: 75.5,
    tuning: { dialHz: 6_070_000, mode: 'AM' },
    bandwidthHz: 4000,
    attenuationDb: 0,
    sinpo: { s: 4, i: 4, n: 3, p: 3, o: 'X' },
    rst: { r: 5, s: 7, t: 9 },
    meter: { s: 9, overDb: 12.5 },
    noiseMeter: { dbm: -101.5 },
    carried: ['sinpo', 'meter'],
    programme: [{ at: AT, text: 'Talk, then “music” 😀' }],
    remarks: 'Fading.',
    stationName: 'Channel 292',
    heardBy: 'Kid brother',
  };
}

function samplesBeside(parents: Record<'receiver' | 'site' | 'setup' | 'reception', Change>) {
  return {
    'clock-check': newRecord('clock-check', {
      deviceId: 'phone001',
      deviceAt: AT,
      offsetMs: -4_000_000_000_000,
      uncertaintyMs: 120,
      method: 'tone',
      pathKm: 812.5,
    }),
    'dial-check': newRecord('dial-check', {
      receiverId: parents.receiver.id,
      at: AT,
      referenceHz: 10_000_000,
      dialHz: 10_000_030,
      errorPpm: 3.000000001,
      uncertaintyPpm: 0.5,
      method: 'zero-beat',
      temperatureC: -4.5,
    }),
    'noise-reading': newRecord('noise-reading', {
      siteId: parents.site.id,
      setupId: parents.setup.id,
      at: AT,
      dialHz: 2_999_999_999,
      bandwidthHz: 2500,
      meter: { dbm: -110 },
    }),
    attachment: newRecord('attachment', {
      receptionId: parents.reception.id,
      kind: 'photo',
      bytes: 2_097_152,
      sha256: 'ab'.repeat(32),
      takenAt: AT,
      caption: 'The dune',
    }),
  };
}
