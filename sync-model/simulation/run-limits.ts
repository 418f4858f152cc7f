/** With one change a round and two records a page, a good hundred records need this many. */
export const ROUNDS_TO_QUIET_MAX = 80;
export const STEPS_ACTIVE = 330;
/** Against a standstill: far more than any run needs. */
export const TURNS_MAX = 10_000;
export const STEPS_TO_REST_MAX = 50_000;
