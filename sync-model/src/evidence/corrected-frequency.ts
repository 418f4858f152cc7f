import type { DialCheck } from '../records/dial-check.js';

export type FrequencyCheck = Pick<DialCheck, 'at' | 'errorPpm' | 'uncertaintyPpm'> & {
  readonly deleted?: boolean;
};

export type CorrectedFrequency = {
  /** The true frequency by the nearest check, Hz, not rounded. */
  readonly frequencyHz: number;
  readonly basis: 'nearest' | 'unchecked';
  /** (dial − true) / true × 10⁶ of the check that was used; 0 when unchecked. */
  readonly errorPpm: number;
  /** UTC ms of that check; null when unchecked. */
  readonly checkedAt: number | null;
};

/**
 * The true frequency behind a dial reading, from the dial checks of its receiver: the check nearest in time,
 * of two as near the more certain, then the earlier one. Without a check the dial is taken as it is and
 * marked. errorPpm = (dial − true) / true × 10⁶ (records.md), so true = dial / (1 + errorPpm / 10⁶).
 */
export function correctedFrequencyHz(
  dialHz: number,
  checks: readonly FrequencyCheck[],
  atMs: number,
): CorrectedFrequency {
  let best: FrequencyCheck | undefined;
  for (const check of checks) {
    if (!check.deleted && (!best || isBetter(check, best, atMs))) best = check;
  }
  if (!best) return { frequencyHz: dialHz, basis: 'unchecked', errorPpm: 0, checkedAt: null };
  return {
    frequencyHz: dialHz / (1 + best.errorPpm / 1e6),
    basis: 'nearest',
    errorPpm: best.errorPpm,
    checkedAt: best.at,
  };
}

function isBetter(a: FrequencyCheck, b: FrequencyCheck, atMs: number): boolean {
  const order =
    Math.abs(a.at - atMs) - Math.abs(b.at - atMs) ||
    a.uncertaintyPpm - b.uncertaintyPpm ||
    a.at - b.at ||
    a.errorPpm - b.errorPpm;
  return order < 0;
}
