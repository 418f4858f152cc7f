import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { canonicalJson } from '../../merge/canonical-json.js';
import { placeSchema } from '../../records/site.js';
import { locatorOf, squareOf } from '../locator/locator.js';
import { pathBetween } from './path.js';
import { defaultShareCharacters, placeFromFix, sharedPath, sharedPosition } from './shared-path.js';

const anyPosition = fc.record({
  latDeg: fc.double({ min: -90, max: 90, noNaN: true }),
  lonDeg: fc.double({ min: -180, max: 180, noNaN: true }),
});
const anyCharacters = fc.constantFrom<4 | 6 | 8>(4, 6, 8);
const anyShare = fc.double({ min: 0.001, max: 0.999, noNaN: true });
const FIX = { latDeg: 55.62384, lonDeg: 8.09417 };
const MAST = { latDeg: 51.5, lonDeg: 0.1 };

describe('what others see of a place', () => {
  it('should be byte-equal for any two exact points in the same square', () => {
    const shares = fc.tuple(anyShare, anyShare);
    fc.assert(
      fc.property(
        anyPosition,
        anyCharacters,
        shares,
        shares,
        anyPosition,
        (where, characters, one, other, to) => {
          const square = squareOf(locatorOf(where, characters));
          const pointAt = ([up, right]: [number, number]) => ({
            latDeg: square.southDeg + up * (square.northDeg - square.southDeg),
            lonDeg: square.westDeg + right * (square.eastDeg - square.westDeg),
          });
          const seenFrom = (point: { latDeg: number; lonDeg: number }) => {
            const place = placeFromFix(point, characters);
            return canonicalJson({ place, position: sharedPosition(place), path: sharedPath(place, to) });
          };
          expect(seenFrom(pointAt(one))).toBe(seenFrom(pointAt(other)));
        },
      ),
      { numRuns: 1000 },
    );
  });

  it('should round distances to 10 km at six and eight characters, 100 km at four, bearings to degrees', () => {
    for (const [characters, stepKm] of [
      [4, 100],
      [6, 10],
      [8, 10],
    ] as const) {
      const path = sharedPath(placeFromFix(FIX, characters), MAST);
      expect(path.roundedToKm).toBe(stepKm);
      expect(path.distanceKm % stepKm).toBe(0);
      expect(path.longDistanceKm % stepKm).toBe(0);
      expect(Number.isInteger(path.bearingDeg) && Number.isInteger(path.backBearingDeg)).toBe(true);
    }
  });

  it('should not be rounded where the owner shared the exact point', () => {
    const place = placeFromFix(FIX, 'exact');
    expect(place).toEqual(FIX);
    expect(sharedPath(place, MAST)).toEqual({ ...pathBetween(FIX, MAST), roundedToKm: null });
  });

  it('should take nothing of a fix but its position', () => {
    const fix = { ...FIX, accuracyM: 4, source: 'live', fixedAt: 1_700_000_000_000 };
    expect(placeFromFix(fix, 'exact')).toEqual(FIX);
    expect(placeFromFix(fix, 6)).toEqual({ locator: 'JO45bo' });
  });

  it('should always be a place that a site may hold, with whole bearings below 360', () => {
    fc.assert(
      fc.property(anyPosition, anyCharacters, anyPosition, (fix, characters, to) => {
        const place = placeFromFix(fix, characters);
        expect(placeSchema.safeParse(place).success).toBe(true);
        const { bearingDeg, backBearingDeg, longBearingDeg } = sharedPath(place, to);
        for (const bearing of [bearingDeg, backBearingDeg, longBearingDeg]) {
          expect(Number.isInteger(bearing) && bearing >= 0 && bearing < 360).toBe(true);
        }
      }),
    );
  });
});

describe('how much of a place is offered to be shared', () => {
  it.each([
    [false, 'quiet-rural', 6],
    [false, 'rural', 6],
    [false, 'residential', 4],
    [false, 'city', 4],
    [true, 'quiet-rural', 4],
  ] as const)('should be, home %s in a %s environment, %i characters', (home, environment, characters) => {
    expect(defaultShareCharacters({ home, environment })).toBe(characters);
  });

  it('should offer no square finer than the fix is good for', () => {
    expect(defaultShareCharacters({ home: false, environment: 'rural', accuracyM: 69_000 })).toBe(4);
    expect(defaultShareCharacters({ home: false, environment: 'rural', accuracyM: 40 })).toBe(6);
  });
});
