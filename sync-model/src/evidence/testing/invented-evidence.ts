import type { EvidenceInput, EvidenceReception, ReceptionFields } from '../evidence-input.js';
import { formatStamp } from '../../stamp/stamp.js';

/** An invented club with as little in it as a test can do with; nothing here is a real place, station or product. */

export const DEVICE = 'pebble01';
/** Thursday 12 November 2026, 19:00 UTC. */
export const EVENING = Date.UTC(2026, 10, 12, 19);
export const MINUTE_MS = 60_000;
export const HOUR_MS = 60 * MINUTE_MS;
export const DAY_MS = 24 * HOUR_MS;

/** Receivers: `bench` uncalibrated, `lab` calibrated, `mute` without a meter. Antennas: `wire`, `whip`. */
export const SETUPS = {
  'bench-wire': { receiverId: 'bench', antennaId: 'wire', attenuationDb: 0, preampDb: 0 },
  'bench-whip': { receiverId: 'bench', antennaId: 'whip', attenuationDb: 0, preampDb: 0 },
  'lab-wire': { receiverId: 'lab', antennaId: 'wire', attenuationDb: 0, preampDb: 0 },
} as const;

const scale = (kind: 's' | 'dbm' | 'none', calibrated: boolean) => ({
  meterScale: { kind, s9Dbm: -73, dbPerS: 6, calibrated },
});

/**
 * Targets: `tern` on 6 070 kHz from 18:00 to 21:00 UTC, silent on 20 November; `plover` always on 6 070 kHz;
 * `dunlin` always on 5 000 kHz.
 */
export function anInput(
  receptions: readonly EvidenceReception[],
  more: Partial<EvidenceInput> = {},
): EvidenceInput {
  const silence = { from: Date.UTC(2026, 10, 20), to: Date.UTC(2026, 10, 21) };
  const evenings = [{ from: '18:00', to: '21:00', days: [1, 2, 3, 4, 5, 6, 7] }];
  return {
    region: 1,
    receptions,
    sites: new Map([
      ['dune', { place: { locator: 'JO46ac' } }],
      ['heath', { place: { locator: 'JO46' } }],
      ['island', { place: { latDeg: 57.2, lonDeg: 8.1 } }],
    ]),
    setups: new Map(Object.entries(SETUPS)),
    receivers: new Map([
      ['bench', scale('s', false)],
      ['lab', scale('dbm', true)],
      ['mute', scale('none', false)],
    ]),
    targets: new Map([
      ['tern', { schedule: evenings, silences: [silence] }],
      ['plover', { schedule: 'always' as const, silences: [] }],
      ['dunlin', { schedule: 'always' as const, silences: [] }],
    ]),
    clockChecks: [],
    dialChecks: [],
    outings: [],
    ...more,
  };
}

/** A try of `plover`, heard with O 4 at the dune on Thursday evening; `more` says what is different. */
export function aReception(
  id: string,
  more: Partial<ReceptionFields> = {},
  { ownerId = 'asta', deviceId = DEVICE }: { ownerId?: string | null; deviceId?: string } = {},
): EvidenceReception {
  const fields: ReceptionFields = {
    deleted: false,
    siteId: 'dune',
    setupId: 'bench-wire',
    targetId: 'plover',
    targetHz: 6_070_000,
    outcome: 'heard',
    basis: 'round',
    identity: 'sure',
    deviceAt: EVENING,
    durationS: null,
    tuning: { dialHz: 6_070_000, mode: 'AM' },
    attenuationDb: null,
    sinpo: null,
    meter: null,
    carried: null,
    ...more,
  };
  if (more.sinpo === undefined && fields.outcome === 'heard') fields.sinpo = scored(4);
  return {
    id,
    ownerId,
    fields,
    deviceAtStamp: formatStamp({ wallMs: fields.deviceAt, counter: 0, deviceId }),
  };
}

export function scored(o: 1 | 2 | 3 | 4 | 5 | 'X'): NonNullable<ReceptionFields['sinpo']> {
  return { s: 4, i: 4, n: 4, p: 4, o };
}
