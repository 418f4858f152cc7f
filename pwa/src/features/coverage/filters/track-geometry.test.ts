import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ALL_HOURS } from '../view/hour-range';
import { steppedRange } from './HoursTrack';
import { handleBoxes, rangeAtShare } from './track-geometry';

describe('the track of hours', () => {
  it('should always take a tap on the middle of the handle as where it is', () => {
    const within = fc
      .integer({ min: 1, max: 23 })
      .chain((lengthH) =>
        fc.record({ fromUtc: fc.integer({ min: 0, max: 24 - lengthH }), lengthH: fc.constant(lengthH) }),
      );
    fc.assert(
      fc.property(within, (range) => {
        const { from, to } = handleBoxes(range)[0]!;
        const tapped = rangeAtShare((from + to) / 2 + 1e-6, range);
        expect(tapped).toEqual({ ...range, fromUtc: range.fromUtc % 24 });
      }),
    );
  });

  it('should always give a range of the same length with hours of the day', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -2, max: 3, noNaN: true }),
        fc.integer({ min: 1, max: 24 }),
        (share, lengthH) => {
          const { fromUtc, lengthH: next } = rangeAtShare(share, { fromUtc: 5, lengthH });
          expect(Number.isInteger(fromUtc) && fromUtc >= 0 && fromUtc <= 23).toBe(true);
          expect(next).toBe(lengthH === 24 ? 1 : lengthH);
        },
      ),
    );
  });

  it('should draw a range over midnight at both ends', () => {
    expect(handleBoxes({ fromUtc: 21, lengthH: 6 })).toEqual([
      { from: 21 / 24, to: 1 },
      { from: 0, to: 3 / 24 },
    ]);
    expect(handleBoxes(ALL_HOURS)).toEqual([]);
  });

  it('should step by keys, round the clock, and come back to all hours', () => {
    expect(steppedRange(ALL_HOURS, 'ArrowRight')).toEqual({ fromUtc: 0, lengthH: 1 });
    expect(steppedRange({ fromUtc: 23, lengthH: 3 }, 'ArrowRight')).toEqual({ fromUtc: 0, lengthH: 3 });
    expect(steppedRange({ fromUtc: 4, lengthH: 3 }, 'Escape')).toEqual(ALL_HOURS);
    expect(steppedRange(ALL_HOURS, 'a')).toBeNull();
  });
});
