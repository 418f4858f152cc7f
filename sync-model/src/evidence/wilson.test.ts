import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { wilsonInterval } from './wilson.js';

describe('wilsonInterval', () => {
  // Newcombe 1998, Statistics in Medicine 17, Table I, method 3: printed to four places.
  it.each([
    [81, 263, 0.2553, 0.3662],
    [0, 20, 0, 0.1611],
  ])('should give the printed interval of %i of %i', (heard, n, low, high) => {
    const interval = wilsonInterval(heard, n);
    expect(interval.low).toBeCloseTo(low, 4);
    expect(interval.high).toBeCloseTo(high, 4);
  });

  // Calculated independently from the formula, to four places.
  it.each([
    [23, 60, 0.2709, 0.5098],
    [5, 25, 0.0886, 0.3913],
    [0, 10, 0, 0.2775],
    [10, 10, 0.7225, 1],
    [7, 10, 0.3968, 0.8922],
  ])('should give the calculated interval of %i of %i', (heard, n, low, high) => {
    const interval = wilsonInterval(heard, n);
    expect(interval.low).toBeCloseTo(low, 4);
    expect(interval.high).toBeCloseTo(high, 4);
  });

  it('should say nothing when nothing was tried', () => {
    expect(wilsonInterval(0, 0)).toEqual({ low: 0, high: 1 });
  });

  it('should refuse more heard than tried', () => {
    expect(() => wilsonInterval(6, 5)).toThrow('a share needs 0 ≤ heard ≤ n');
  });

  it('should always lie within 0..1 and hold the share, whole numbers or not', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 100_000 }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (n, share) => {
          const { low, high } = wilsonInterval(share * n, n);
          expect(low).toBeGreaterThanOrEqual(0);
          expect(high).toBeLessThanOrEqual(1);
          expect(low).toBeLessThanOrEqual((share * n) / n);
          expect(high).toBeGreaterThanOrEqual((share * n) / n);
        },
      ),
    );
  });

  it('should mirror when heard and not heard change places', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 5000 }), fc.nat(), (n, any) => {
        const heard = any % (n + 1);
        const a = wilsonInterval(heard, n);
        const b = wilsonInterval(n - heard, n);
        expect(a.low).toBeCloseTo(1 - b.high, 10);
        expect(a.high).toBeCloseTo(1 - b.low, 10);
      }),
    );
  });
});
