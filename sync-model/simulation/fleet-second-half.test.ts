import { describe, expect, it } from 'vitest';
import { FROM, runSeeds, SEEDS, SEEDS_TIMEOUT_MS } from './run-seeds.js';

const START = FROM + Math.ceil(SEEDS / 2);
const COUNT = Math.floor(SEEDS / 2);

/** A file of its own, so that both cores have half of the seeds. */
describe('a fleet of phones', () => {
  it(`should keep every promise in ${COUNT} seeds from ${START}`, { timeout: SEEDS_TIMEOUT_MS }, async () => {
    const { failures } = await runSeeds(START, COUNT);
    expect(failures.join('\n')).toBe('');
  });
});
