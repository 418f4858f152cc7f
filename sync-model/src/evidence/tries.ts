import type { Target } from '../records/target.js';
import type { ReceptionFields } from './evidence-input.js';
import { isOnAir, isSilenced } from './schedule.js';

/** A nil after a shorter listen than this says nothing. */
export const NIL_LISTEN_S_MIN = 10;

/** Why a reception is not in a rate. */
export const LEFT_OUT_REASONS = [
  'deleted',
  'excluded',
  'skipped',
  'chance',
  'swap',
  'import',
  'setup-missing',
  'target-missing',
  'silence',
  'off-schedule',
  'short-nil',
  'unsure-identity',
  'later-in-hour',
] as const;
export type LeftOutReason = (typeof LEFT_OUT_REASONS)[number];

/** What is said beside a figure of the receptions that are not in it. */
export const LEFT_OUT_WORDS: Readonly<Record<LeftOutReason, string>> = {
  deleted: 'Deleted by its owner.',
  excluded: 'Excluded from evidence in review.',
  skipped: 'Skipped: nobody listened.',
  chance: 'Met by chance: gives scores and levels, never a rate.',
  swap: 'Part of a swap test: gives scores and levels, never a rate.',
  import: 'Imported without its nils: gives scores and levels, never a rate.',
  'setup-missing': 'The setup is not known on this device, so neither is the antenna.',
  'target-missing': 'The target is not known on this device, so its schedule cannot be checked.',
  silence: 'The station was off the air then.',
  'off-schedule': 'Outside the schedule of the target by more than 2 minutes.',
  'short-nil': 'A nil after less than 10 seconds of listening.',
  'unsure-identity': 'The station was not surely identified: counts for the frequency, not for the target.',
  'later-in-hour': 'A later try in the same hour: the first one counts.',
};

/**
 * What a reception is good for: `try` counts in heard rates, scores and levels; `scores-only` in scores and
 * levels; `left-out` in nothing. A try with the reason `unsure-identity` counts for its frequency alone.
 */
export type Classification =
  | { readonly counts: 'try'; readonly reason: null | 'unsure-identity' }
  | { readonly counts: 'scores-only'; readonly reason: 'chance' | 'swap' | 'import' }
  | { readonly counts: 'left-out'; readonly reason: LeftOutReason };

/** What has to be looked up to classify a reception. */
export type TryContext = {
  /** Corrected time, UTC ms. */
  readonly atMs: number;
  /** The reception's target; undefined where it has none or the device does not hold it. */
  readonly target: Pick<Target, 'schedule' | 'silences'> | undefined;
  readonly hasSetup: boolean;
  readonly isExcluded: boolean;
};

/**
 * Decides for one reception whether it is a try (product.md, "Evidence"): the one place where that is decided,
 * for phone and server. The first reason that holds is the one that is told.
 */
export function classifyReception(fields: ReceptionFields, context: TryContext): Classification {
  if (fields.deleted) return leftOut('deleted');
  if (context.isExcluded) return leftOut('excluded');
  if (fields.outcome === 'skipped') return leftOut('skipped');
  if (!context.hasSetup) return leftOut('setup-missing');
  if (fields.basis === 'chance' || fields.basis === 'swap' || fields.basis === 'import') {
    return SCORES_ONLY[fields.basis];
  }
  return classifyTry(fields, context);
}

function classifyTry(fields: ReceptionFields, { target, atMs }: TryContext): Classification {
  if (fields.targetId !== null) {
    // A target emptied after its 30 days in the bin is as unknown as one never received.
    if (!target?.schedule) return leftOut('target-missing');
    if (isSilenced(target, atMs)) return leftOut('silence');
    if (!isOnAir(target.schedule, atMs)) return leftOut('off-schedule');
  }
  if (fields.outcome === 'nil') return isShort(fields) ? leftOut('short-nil') : TRY;
  return fields.targetId !== null && fields.identity !== 'sure' ? TRY_OF_FREQUENCY : TRY;
}

/** An unknown listening time is taken on the word of the operator, who answered *Nil*. */
function isShort({ durationS }: ReceptionFields): boolean {
  return durationS !== null && durationS < NIL_LISTEN_S_MIN;
}

const TRY: Classification = { counts: 'try', reason: null };
const TRY_OF_FREQUENCY: Classification = { counts: 'try', reason: 'unsure-identity' };
const SCORES_ONLY = {
  chance: { counts: 'scores-only', reason: 'chance' },
  swap: { counts: 'scores-only', reason: 'swap' },
  import: { counts: 'scores-only', reason: 'import' },
} as const satisfies Record<string, Classification>;

/** One value per reason: a hundred thousand receptions share them. */
const LEFT_OUT = new Map<LeftOutReason, Classification>(
  LEFT_OUT_REASONS.map((reason) => [reason, { counts: 'left-out', reason }]),
);

function leftOut(reason: LeftOutReason): Classification {
  return LEFT_OUT.get(reason)!;
}
