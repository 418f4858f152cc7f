import { runFleet } from './fleet.js';
import type { RunResult } from './run-result.js';

export type SeedsReport = {
  /** One text for each seed that broke a promise, with how to replay it; the first three at most. */
  readonly failures: readonly string[];
  readonly reached: ReadonlySet<string>;
};

const FAILURES_MAX = 3;

/** The seeds that `npm run simulate -- --seeds N --from S` asks for, or else those of `npm test`. */
export const SEEDS = Number(process.env.SEEDS ?? 2000);
export const FROM = Number(process.env.FROM ?? 1);
/** So many seeds meet every rare state; fewer cannot be held to it. */
export const SEEDS_FOR_RARE_STATES = 900;
/** A limit against a standstill, not a measurement. */
export const SEEDS_TIMEOUT_MS = 6 * 3_600_000;

export async function runSeeds(from: number, count: number): Promise<SeedsReport> {
  const reached = new Set<string>();
  const failures: string[] = [];
  for (let seed = from; seed < from + count && failures.length < FAILURES_MAX; seed += 1) {
    const result = await runFleet(seed);
    for (const state of result.reached) reached.add(state);
    if (result.violations.length > 0) failures.push(failureText(result));
  }
  return { failures, reached };
}

function failureText({ seed, violations }: RunResult): string {
  const found = violations.slice(0, 5).map(({ invariant, what }) => `  ${invariant}: ${what}`);
  return [
    `seed ${seed} broke a promise; replay: npm run simulate -- --seeds 1 --from ${seed}`,
    ...found,
  ].join('\n');
}
