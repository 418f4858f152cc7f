import { describe, expect, it } from 'vitest';
import { runFleet } from './fleet.js';
import { RARE_STATES } from './rare-states.js';
import { FROM, runSeeds, SEEDS, SEEDS_FOR_RARE_STATES, SEEDS_TIMEOUT_MS } from './run-seeds.js';

const COUNT = Math.ceil(SEEDS / 2);

describe('a fleet of phones', () => {
  it(`should keep every promise in ${COUNT} seeds from ${FROM}`, { timeout: SEEDS_TIMEOUT_MS }, async () => {
    const { failures, reached } = await runSeeds(FROM, COUNT);
    expect(failures.join('\n')).toBe('');
    if (COUNT >= SEEDS_FOR_RARE_STATES) {
      expect(RARE_STATES.filter((state) => !reached.has(state))).toEqual([]);
    }
  });

  it('should do the same whenever the seed is the same', async () => {
    for (const seed of [1, 2, 3, 4, 5]) {
      const [first, second] = [await runFleet(seed), await runFleet(seed)];
      expect(second.traceHash).toBe(first.traceHash);
      expect(second.steps).toBe(first.steps);
    }
  });
});
