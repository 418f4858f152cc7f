import { describe, expect, it } from 'vitest';
import { runFleet, type RunResult } from './fleet.js';
import { RARE_STATES } from './rare-states.js';

const SEEDS = Number(process.env.SEEDS ?? 2000);
const FROM = Number(process.env.FROM ?? 1);

function failureText({ seed, violations }: RunResult): string {
  const found = violations.slice(0, 5).map(({ invariant, what }) => `  ${invariant}: ${what}`);
  return [
    `seed ${seed} broke a promise; replay: npm run simulate -- --seeds 1 --from ${seed}`,
    ...found,
  ].join('\n');
}

describe('a fleet of phones', () => {
  it(`should keep every promise in ${SEEDS} seeds from ${FROM}`, { timeout: 3_600_000 }, async () => {
    const reached = new Set<string>();
    const failures: string[] = [];
    for (let seed = FROM; seed < FROM + SEEDS && failures.length < 3; seed += 1) {
      const result = await runFleet(seed);
      for (const state of result.reached) reached.add(state);
      if (result.violations.length > 0) failures.push(failureText(result));
    }
    expect(failures.join('\n')).toBe('');
    // A few seeds cannot meet everything.
    if (SEEDS >= 1000) expect(RARE_STATES.filter((state) => !reached.has(state))).toEqual([]);
  });

  it('should do the same whenever the seed is the same', async () => {
    for (const seed of [1, 2, 3, 4, 5]) {
      const [first, second] = [await runFleet(seed), await runFleet(seed)];
      expect(second.traceHash).toBe(first.traceHash);
      expect(second.steps).toBe(first.steps);
    }
  });
});
