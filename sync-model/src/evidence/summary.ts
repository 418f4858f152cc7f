import type { Entry } from './entries.js';
import type { EvidenceInput } from './evidence-input.js';
import { entryMatcher, filterObservations, rateFor, type EvidenceFilter } from './filter.js';
import type { HeardRate } from './heard-rate.js';
import { levels, type LevelGroup } from './levels.js';
import { observationsOf, type Observation, type Observations } from './observations.js';
import { LEFT_OUT_REASONS, LEFT_OUT_WORDS, type LeftOutReason } from './tries.js';
import { typicalScore, type TypicalScore } from './typical-score.js';

export type LeftOut = {
  readonly reason: LeftOutReason;
  /** A sentence for people. */
  readonly words: string;
  readonly count: number;
  readonly receptionIds: readonly string[];
};

/** A figure with all that stands behind it. */
export type Evidence = {
  readonly observations: readonly Observation[];
  readonly rate: HeardRate;
  readonly score: TypicalScore;
  readonly levels: readonly LevelGroup[];
  /** Scores of what counts in no rate (chance, swap, import): shown apart, never mixed in. */
  readonly scoresBeside: TypicalScore;
  /** Observations whose reception is in review: they count and are marked. */
  readonly inReview: number;
  /** Observations whose time no clock check reaches. */
  readonly uncheckedTimes: number;
  /** In a fixed order, only reasons that occur. */
  readonly leftOut: readonly LeftOut[];
};

/** The evidence that a filter asks for, from receptions. Where several are asked for, count once and take `evidenceOf`. */
export function squareEvidence(input: EvidenceInput, filter: EvidenceFilter): Evidence {
  return evidenceOf(observationsOf(input), input, filter);
}

/** As `squareEvidence`, from observations that were counted before. */
export function evidenceOf(
  counted: Observations,
  lookups: Pick<EvidenceInput, 'sites' | 'receivers'>,
  filter: EvidenceFilter,
): Evidence {
  const observations = filterObservations(counted, filter, lookups.sites);
  const entries = counted.entries.filter(entryMatcher(filter, lookups.sites));
  return {
    observations,
    rate: rateFor(observations, filter),
    score: typicalScore(observations),
    levels: levels(observations, lookups.receivers),
    scoresBeside: typicalScore(entries.filter(({ counts }) => counts === 'scores-only')),
    inReview: observations.filter(({ isInReview }) => isInReview).length,
    uncheckedTimes: observations.filter(({ timeBasis }) => timeBasis === 'unchecked').length,
    leftOut: leftOutOf(entries, observations),
  };
}

/** Every entry within the filter that is no observation of it, by reason. */
function leftOutOf(entries: readonly Entry[], observations: readonly Entry[]): LeftOut[] {
  const counted = new Set(observations.map(({ receptionId }) => receptionId));
  const byReason = new Map<LeftOutReason, string[]>();
  for (const { receptionId, reason } of entries) {
    if (counted.has(receptionId)) continue;
    const why = reason ?? 'later-in-hour';
    const ids = byReason.get(why);
    if (ids) ids.push(receptionId);
    else byReason.set(why, [receptionId]);
  }
  return LEFT_OUT_REASONS.flatMap((reason) => {
    const receptionIds = byReason.get(reason);
    if (!receptionIds) return [];
    return [
      {
        reason,
        words: LEFT_OUT_WORDS[reason],
        count: receptionIds.length,
        receptionIds: receptionIds.sort(),
      },
    ];
  });
}
