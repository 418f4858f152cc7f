/** Limits of one round; a phone that keeps them is never refused for size. */
export const CHANGES_PER_ROUND_MAX = 1000;
export const CHANGES_PER_TRANSACTION_MAX = 250;
export const ROUND_BYTES_MAX = 4 * 1024 * 1024;
/** What a phone fills of a round: the rest is left for the envelope. */
export const ROUND_BYTES_FILLED_MAX = 3.5 * 1024 * 1024;
/** One change; the largest record that the schemas allow stays below it. */
export const CHANGE_BYTES_MAX = 256 * 1024;
/** Records in one answer, over all its clubs. */
export const RECORDS_PER_PAGE_MAX = 1000;
export const CLUBS_PER_ROUND_MAX = 50;
/** A longer value is left out of the history; its size stays. */
export const FIELD_BYTES_HISTORY_MAX = 4096;

/** The limits that decide where a round is cut; a test hands in small ones, so that cuts happen. */
export type RoundLimits = {
  readonly changesPerRound: number;
  readonly changesPerTransaction: number;
  readonly recordsPerPage: number;
};

export const ROUND_LIMITS: RoundLimits = {
  changesPerRound: CHANGES_PER_ROUND_MAX,
  changesPerTransaction: CHANGES_PER_TRANSACTION_MAX,
  recordsPerPage: RECORDS_PER_PAGE_MAX,
};
