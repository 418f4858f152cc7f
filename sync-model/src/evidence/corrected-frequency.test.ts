import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { correctedFrequencyHz } from './corrected-frequency.js';

const check = (at: number, errorPpm: number, uncertaintyPpm = 1) => ({ at, errorPpm, uncertaintyPpm });

describe('correctedFrequencyHz', () => {
  // domain.md 9: 10 Hz at 10 MHz is 1 ppm (calculated there).
  it('should take 10 Hz off a 10 MHz dial that reads 1 ppm high', () => {
    const { frequencyHz, basis } = correctedFrequencyHz(10_000_010, [check(0, 1)], 5);
    expect(frequencyHz).toBeCloseTo(10_000_000, 6);
    expect(basis).toBe('nearest');
  });

  it('should use the check nearest in time, before or after', () => {
    const checks = [check(0, 10), check(100, 20), check(1000, 30)];
    expect(correctedFrequencyHz(5_000_000, checks, 90).errorPpm).toBe(20);
    expect(correctedFrequencyHz(5_000_000, checks, 5000).errorPpm).toBe(30);
  });

  it('should take the more certain of two checks as near', () => {
    expect(correctedFrequencyHz(5_000_000, [check(0, 10, 5), check(100, 20, 1)], 50).errorPpm).toBe(20);
  });

  it('should keep the dial, marked, when there is no check', () => {
    const deleted = { ...check(0, 10), deleted: true };
    expect(correctedFrequencyHz(5_000_000, [deleted], 0)).toEqual({
      frequencyHz: 5_000_000,
      basis: 'unchecked',
      errorPpm: 0,
      checkedAt: null,
    });
  });

  it('should always undo the error that its check measured, in any order of checks', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1000, max: 3_000_000_000 }),
        fc.array(fc.tuple(fc.nat(5), fc.integer({ min: -90_000, max: 90_000 }), fc.nat(3)), { minLength: 1 }),
        fc.nat(5),
        (dialHz, parts, atMs) => {
          const checks = parts.map((part) => check(...part));
          const found = correctedFrequencyHz(dialHz, checks, atMs);
          expect(((dialHz - found.frequencyHz) / found.frequencyHz) * 1e6).toBeCloseTo(found.errorPpm, 4);
          expect(correctedFrequencyHz(dialHz, checks.reverse(), atMs)).toEqual(found);
        },
      ),
    );
  });
});
