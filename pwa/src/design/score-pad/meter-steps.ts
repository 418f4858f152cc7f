import type { MeterReading } from '@harkmoor/sync-model/records/common-fields';
import { figureText } from '@harkmoor/sync-model/radio/figure-text';

export type MeterKind = 's' | 'dbm';
export type MeterKey = { label: string; spoken: string; reading: MeterReading };

const S_UNITS = [1, 2, 3, 4, 5, 6, 7, 8, 9];
const OVER_DB = [10, 20, 40];
const LEVELS_DBM = [-130, -120, -110, -100, -90, -80, -70, -60, -50, -40, -30, -20];

const S_KEYS: readonly MeterKey[] = [
  ...S_UNITS.map((s) => ({ label: `S${s}`, spoken: `S${s}`, reading: { s, overDb: 0 } })),
  ...OVER_DB.map((overDb) => ({
    label: `+${overDb}`,
    spoken: `S9 plus ${overDb}`,
    reading: { s: 9, overDb },
  })),
];
const DBM_KEYS: readonly MeterKey[] = LEVELS_DBM.map((dbm) => ({
  label: figureText(dbm, 0),
  spoken: `minus ${-dbm} dBm`,
  reading: { dbm },
}));

/** Twelve keys, two rows of six: the marks of an S-meter, or whole tens of dBm. */
export function keysOf(kind: MeterKind): readonly MeterKey[] {
  return kind === 's' ? S_KEYS : DBM_KEYS;
}

/** One finer step: an S-unit up to S9, 5 dB above it as the scales are marked; 1 dB where the meter reads dBm. */
export function nudged(reading: MeterReading | null, kind: MeterKind, step: -1 | 1): MeterReading | null {
  if (reading === null) return null;
  if ('dbm' in reading) return { dbm: clamp(reading.dbm + step, -150, 20) };
  if (kind === 'dbm') return reading;
  if (reading.s === 9 && (step > 0 || reading.overDb > 0)) {
    return { s: 9, overDb: clamp(reading.overDb + 5 * step, 0, 80) };
  }
  return { s: clamp(reading.s + step, 0, 9), overDb: 0 };
}

export function sameReading(a: MeterReading, b: MeterReading): boolean {
  if ('dbm' in a) return 'dbm' in b && a.dbm === b.dbm;
  return 's' in b && a.s === b.s && a.overDb === b.overDb;
}

function clamp(value: number, low: number, high: number): number {
  return Math.min(high, Math.max(low, value));
}
