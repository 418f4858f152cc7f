import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { assertPosition, wrapBearingDeg, wrapLonDeg } from './position.js';

describe('a longitude and a bearing beyond their range', () => {
  it.each([
    [180, -180],
    [-180, -180],
    [190, -170],
    [-540, -180],
    [0, 0],
    [179.5, 179.5],
  ])('should bring longitude %f to %f', (lonDeg, wrapped) => {
    expect(wrapLonDeg(lonDeg)).toBe(wrapped);
  });

  it('should always stay in range', () => {
    fc.assert(
      fc.property(fc.double({ min: -1e6, max: 1e6, noNaN: true }), (degrees) => {
        expect(wrapLonDeg(degrees)).toBeGreaterThanOrEqual(-180);
        expect(wrapLonDeg(degrees)).toBeLessThan(180);
        expect(wrapBearingDeg(degrees)).toBeGreaterThanOrEqual(0);
        expect(wrapBearingDeg(degrees)).toBeLessThan(360);
      }),
      { examples: [[-1e-17], [-1e-14], [359.99999999999994]] },
    );
  });
});

describe('a position', () => {
  it.each([
    [90.0001, 0],
    [Number.NaN, 0],
    [0, Number.POSITIVE_INFINITY],
  ])('should be refused at %f, %f', (latDeg, lonDeg) => {
    expect(() => assertPosition({ latDeg, lonDeg })).toThrow('No position on Earth');
  });
});
