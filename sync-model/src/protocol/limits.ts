/** Limits of one round; a phone that keeps them is never refused for size. */
export const CHANGES_PER_ROUND_MAX = 1000;
export const CHANGES_PER_TRANSACTION_MAX = 250;
export const ROUND_BYTES_MAX = 4 * 1024 * 1024;
export const RECORDS_PER_PAGE_MAX = 1000;
export const CLUBS_PER_ROUND_MAX = 50;
export const FIELD_BYTES_HISTORY_MAX = 4096;
