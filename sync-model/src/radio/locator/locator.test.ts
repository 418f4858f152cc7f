import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { placeSchema } from '../../records/site.js';
import {
  centreOf,
  coarser,
  isLocator,
  locatorOf,
  normaliseLocator,
  squareOf,
  type LocatorCharacters,
} from './locator.js';

const lengths: LocatorCharacters[] = [2, 4, 6, 8];
const anyLength = fc.constantFrom(...lengths);
const anyPosition = fc.record({
  latDeg: fc.double({ min: -90, max: 90, noNaN: true }),
  lonDeg: fc.double({ min: -180, max: 180, noNaN: true }),
});
const letters = (last: string) => fc.stringMatching(new RegExp(`^[a-${last}]{2}$`));
const digits = fc.stringMatching(/^[0-9]{2}$/);
const anyLocator = fc
  .tuple(letters('r'), digits, letters('x'), digits, anyLength)
  .map(([field, square, subsquare, extended, length]) =>
    (field.toUpperCase() + square + subsquare + extended).slice(0, length),
  );

describe('the locator of a point', () => {
  it.each([
    // Test file of a public Earth-coordinates module (KN41la) and notes of a pocket-calculator program (IO91wl).
    [41.0167, 28.9667, 'KN41la'],
    [51.48, -0.13, 'IO91wl'],
    // From memory: widely printed examples.
    [41.714775, -72.72726, 'FN31pr21'],
    [48.14666, 11.60833, 'JN58td25'],
    [-41.28333, 174.745, 'RE78ir'],
    // Convention, calculated: corners belong to the north-east, the pole to the top row, +180° is −180°.
    [0, 0, 'JJ00aa00'],
    [-90, -180, 'AA00aa00'],
    [90, 0, 'JR09ax09'],
    [40, 180, 'AN00aa00'],
    [40, -180, 'AN00aa00'],
    [40, 179.99999, 'RN90xa90'],
  ])('should be right for %f, %f: %s', (latDeg, lonDeg, locator) => {
    expect(locatorOf({ latDeg, lonDeg }, locator.length as LocatorCharacters)).toBe(locator);
  });

  it('should always lie in its own square', () => {
    fc.assert(
      fc.property(anyPosition, anyLength, (position, characters) => {
        const { southDeg, westDeg, northDeg, eastDeg } = squareOf(locatorOf(position, characters));
        const lonDeg = position.lonDeg === 180 ? -180 : position.lonDeg;
        expect(position.latDeg).toBeGreaterThanOrEqual(southDeg - 2e-9);
        expect(position.latDeg).toBeLessThanOrEqual(northDeg);
        // A hair west of 180° counts as on it, like a hair before any other edge.
        const wrapped = lonDeg > 180 - 2e-9 ? lonDeg - 360 : lonDeg;
        expect(wrapped).toBeGreaterThanOrEqual(westDeg - 2e-9);
        expect(wrapped).toBeLessThanOrEqual(eastDeg);
      }),
    );
  });

  it('should always begin with the coarser locator of the same point', () => {
    fc.assert(
      fc.property(anyPosition, (position) => {
        const finest = locatorOf(position, 8);
        for (const characters of lengths) {
          expect(locatorOf(position, characters)).toBe(coarser(finest, characters));
        }
      }),
    );
  });

  it('should always be one that a place may hold from four characters on', () => {
    fc.assert(
      fc.property(anyPosition, fc.constantFrom<LocatorCharacters>(4, 6, 8), (position, characters) => {
        expect(placeSchema.safeParse({ locator: locatorOf(position, characters) }).success).toBe(true);
      }),
    );
  });

  it('should refuse what is no point on Earth', () => {
    expect(() => locatorOf({ latDeg: 90.1, lonDeg: 0 }, 6)).toThrow('No position on Earth');
    expect(() => locatorOf({ latDeg: 0, lonDeg: Number.NaN }, 6)).toThrow('No position on Earth');
    expect(() => locatorOf({ latDeg: Number.NaN, lonDeg: 0 }, 6)).toThrow('No position on Earth');
  });
});

describe('the centre of a locator', () => {
  it.each([
    // Test file of a public Earth-coordinates module.
    ['FM18lv', 38.896, -77.042],
    ['FM18', 38.5, -77],
    // Notes of a pocket-calculator program.
    ['IO91wl', 51.479, -0.125],
  ])('should be right for %s', (locator, latDeg, lonDeg) => {
    const centre = centreOf(locator);
    expect(Math.abs(centre.latDeg - latDeg)).toBeLessThan(0.0006);
    expect(Math.abs(centre.lonDeg - lonDeg)).toBeLessThan(0.0006);
  });

  it('should always have the same locator again', () => {
    fc.assert(
      fc.property(anyLocator, (locator) => {
        expect(locatorOf(centreOf(locator), locator.length as LocatorCharacters)).toBe(locator);
      }),
      { numRuns: 2000 },
    );
  });

  it('should share its square with the south-west corner', () => {
    fc.assert(
      fc.property(anyLocator, (locator) => {
        const { southDeg, westDeg } = squareOf(locator);
        const corner = { latDeg: southDeg, lonDeg: westDeg };
        expect(locatorOf(corner, locator.length as LocatorCharacters)).toBe(locator);
      }),
      { numRuns: 2000 },
    );
  });
});

describe('the square of a locator', () => {
  it('should have the sizes of the system', () => {
    expect(squareOf('JJ')).toEqual({ southDeg: 0, westDeg: 0, northDeg: 10, eastDeg: 20 });
    expect(squareOf('JJ00')).toEqual({ southDeg: 0, westDeg: 0, northDeg: 1, eastDeg: 2 });
    const { northDeg, eastDeg } = squareOf('JJ00aa');
    expect(northDeg).toBeCloseTo(2.5 / 60, 12);
    expect(eastDeg).toBeCloseTo(5 / 60, 12);
    expect(squareOf('JJ00aa00').northDeg).toBeCloseTo(15 / 3600, 12);
  });
});

describe('a typed locator', () => {
  it.each([
    ['jo46AC', 'JO46ac'],
    [' jn58TD25 ', 'JN58td25'],
    ['io', 'IO'],
  ])('should be spelt as usual: %j', (typed, locator) => {
    expect(normaliseLocator(typed)).toBe(locator);
  });

  it.each([
    '',
    'J',
    'JO4',
    'SO46',
    'JS46',
    'JO46ay',
    'JOaa',
    '12JO',
    'JO46ac1',
    'JO46ac123',
    'JO 46',
    'ÅO46',
  ])('should not be read: %j', (typed) => {
    expect(isLocator(typed)).toBe(false);
    expect(() => centreOf(typed)).toThrow('no locator');
  });

  it('should stay as it is when it is coarse enough already', () => {
    expect(coarser('JO46', 6)).toBe('JO46');
    expect(coarser('jo46ac', 4)).toBe('JO46');
  });
});
