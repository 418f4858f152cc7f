import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { medianRanks } from './median-interval.js';
import { typicalScore } from './typical-score.js';

const heard = (o: number | null) => ({ heard: true, o });

describe('medianRanks', () => {
  // The exact two-sided sign test: 2 of 10, 5 of 20, 7 of 25 and 3 of 15 on the smaller side give p 0.109, 0.041,
  // 0.043 and 0.035; 0 of 5 and 0 of 6 give 0.0625 and 0.031 (encyclopedia quoting Zar for n = 10; the others
  // calculated). The interval leaves out as many on each side as still give p ≤ 0.05, and begins with the next.
  it.each([
    [6, 1],
    [10, 2],
    [15, 4],
    [20, 6],
    [25, 8],
  ])('should begin the interval of %i values at rank %i', (n, low) => {
    expect(medianRanks(n)).toEqual({ low, high: n + 1 - low });
  });

  it('should be none under six values', () => {
    expect(medianRanks(5)).toBeNull();
  });

  it('should not jump where the approximation takes over', () => {
    const exact = medianRanks(1000)!.low;
    expect([0, 1]).toContain(medianRanks(1001)!.low - exact);
  });
});

describe('typicalScore', () => {
  it('should be the median of what was heard with its distribution', () => {
    // The drawing of a square: 4 in 22, 3 in 29, 2 in 7.
    const scores = [...Array(22).fill(4), ...Array(29).fill(3), ...Array(7).fill(2)].map(heard);
    expect(typicalScore([...scores, { heard: false, o: null }, heard(null)])).toEqual({
      median: 3,
      interval: { low: 3, high: 4 },
      n: 58,
      distribution: [0, 7, 29, 22, 0],
      unscored: 1,
    });
  });

  it('should lie half way where the two in the middle differ', () => {
    expect(typicalScore([heard(2), heard(5)]).median).toBe(3.5);
  });

  it('should be nothing where nothing was scored', () => {
    expect(typicalScore([{ heard: false, o: null }])).toMatchObject({ median: null, interval: null, n: 0 });
  });

  it('should always be the middle of the sorted scores, within its interval', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 1, max: 5 }), { minLength: 1, maxLength: 40 }), (scores) => {
        const sorted = [...scores].sort();
        const middle = sorted.length / 2;
        const median = (sorted[Math.ceil(middle) - 1]! + sorted[Math.floor(middle)]!) / 2;
        const found = typicalScore(scores.map(heard));
        expect(found.median).toBe(median);
        if (found.interval) {
          expect(found.interval.low).toBeLessThanOrEqual(median);
          expect(found.interval.high).toBeGreaterThanOrEqual(median);
        }
      }),
    );
  });
});
