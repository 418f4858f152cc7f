import { medianRanks } from './median-interval.js';
import type { Observation } from './observations.js';

export type TypicalScore = {
  /** Median of the overall scores, halves where the two in the middle differ; null where none was scored. */
  readonly median: number | null;
  /** 95 %, by order statistics; null under six scores. */
  readonly interval: { readonly low: number; readonly high: number } | null;
  /** Scored: the sample of the median. */
  readonly n: number;
  /** How many got the score 1, 2, 3, 4, 5: index 0 is score 1. */
  readonly distribution: readonly [number, number, number, number, number];
  /** Heard, but the overall score was X, not given or only carried over. */
  readonly unscored: number;
};

/**
 * The typical score: median O of what was heard, with its distribution. Nils have no score and are passed over;
 * they show in the heard rate.
 */
export function typicalScore(observations: readonly Pick<Observation, 'heard' | 'o'>[]): TypicalScore {
  const distribution: [number, number, number, number, number] = [0, 0, 0, 0, 0];
  let n = 0;
  let unscored = 0;
  for (const { heard, o } of observations) {
    if (!heard) continue;
    if (o === null) {
      unscored++;
    } else {
      distribution[o - 1]!++;
      n++;
    }
  }
  const ranks = medianRanks(n);
  return {
    median: n === 0 ? null : (atRank(distribution, (n + 1) >> 1) + atRank(distribution, (n + 2) >> 1)) / 2,
    interval: ranks && { low: atRank(distribution, ranks.low), high: atRank(distribution, ranks.high) },
    n,
    distribution,
    unscored,
  };
}

function atRank(distribution: readonly number[], rank: number): number {
  let seen = 0;
  for (let score = 1; score <= 5; score++) {
    seen += distribution[score - 1]!;
    if (seen >= rank) return score;
  }
  throw new Error(`rank ${rank} is beyond ${seen} scores`);
}
