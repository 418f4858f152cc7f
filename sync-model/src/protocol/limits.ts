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
