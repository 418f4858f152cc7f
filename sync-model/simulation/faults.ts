import type { RoundLimits } from '../src/protocol/limits.js';
import type { FateWeights } from './network.js';
import type { Random } from './random.js';

const HOUR_MS = 3_600_000;
const YEAR_MS = 365 * 24 * HOUR_MS;

/** What may happen in one run: each seed has its own mixture, so that rare states are met in pure form too. */
export type Weather = {
  readonly fates: FateWeights;
  readonly crashes: number;
  readonly hubCrashes: number;
  readonly clockJumps: number;
  readonly memberships: number;
  readonly skewsMs: readonly number[];
  readonly lateDeliveries: number;
};

const SKEWS_MS = [0, -50_000, -50_000, 3 * 60_000, -2 * YEAR_MS, 10 * YEAR_MS, HOUR_MS, -HOUR_MS];

export const GOOD_WEATHER: FateWeights = {
  good: 1,
  'request-lost': 0,
  'answer-lost': 0,
  'answer-cut': 0,
  portal: 0,
  late: 0,
  twice: 0,
  unauthorized: 0,
  throttled: 0,
  'server-error': 0,
};

export function weatherFrom(random: Random): Weather {
  const some = (most: number) => (random.chance(0.5) ? random.next() * most : 0);
  return {
    fates: {
      good: 4,
      'request-lost': some(2),
      'answer-lost': some(3),
      'answer-cut': some(1),
      portal: some(0.5),
      late: some(2),
      twice: some(2),
      unauthorized: some(0.3),
      throttled: some(0.3),
      'server-error': some(0.3),
    },
    crashes: some(0.03),
    hubCrashes: some(0.01),
    clockJumps: some(0.02),
    memberships: some(0.006),
    skewsMs: [0, 1, 2].map(() => (random.chance(0.6) ? random.pick(SKEWS_MS) : 0)),
    lateDeliveries: 0.05,
  };
}

export function skewFrom(random: Random): number {
  return random.pick(SKEWS_MS);
}

/** Small ones, so that rounds, transactions and pages are cut. */
export function limitsFrom(random: Random): RoundLimits {
  return {
    changesPerRound: 1 + random.below(5),
    changesPerTransaction: 2,
    recordsPerPage: 2 + random.below(6),
  };
}
