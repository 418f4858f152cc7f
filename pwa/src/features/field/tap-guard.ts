/** A second tap on the same row within this time is a trembling thumb or a raindrop. */
export const SECOND_TAP_MS = 1500;
/** Rows stand still for so long after a tap. */
export const ROWS_STILL_MS = 2000;

/** Lets the first tap on a row through and ignores a second one that comes too soon. Times are ms of any steady clock. */
export function createTapGuard(withinMs = SECOND_TAP_MS) {
  let last: { row: string; atMs: number } | null = null;
  return {
    accepts(row: string, atMs: number): boolean {
      const isTooSoon = last !== null && last.row === row && atMs - last.atMs < withinMs && atMs >= last.atMs;
      if (!isTooSoon) last = { row, atMs };
      return !isTooSoon;
    },
  };
}

export type TapGuard = ReturnType<typeof createTapGuard>;
