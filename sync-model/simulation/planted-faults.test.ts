import { describe, expect, it } from 'vitest';
import { runFleet } from './fleet.js';
import { PLANTED_FAULTS } from './planted-faults.js';

const SEEDS_MAX = 1000;

describe('the simulation', () => {
  it.each(PLANTED_FAULTS)('should find that $name', { timeout: 600_000 }, async (fault) => {
    for (let seed = 1; seed <= SEEDS_MAX; seed += 1) {
      const { violations } = await runFleet(seed, fault);
      if (violations.length > 0) return;
    }
    expect.fail(`not found in ${SEEDS_MAX} seeds`);
  });
});
