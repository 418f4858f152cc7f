import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { squareOf } from '../radio/locator/locator.js';
import { placeOfSite, squaresOf, type SquareCharacters } from './squares.js';
import { anInput } from './testing/invented-evidence.js';
import { anObservation } from './testing/invented-observation.js';

const { sites } = anInput([]);

describe('squaresOf', () => {
  it('should gather the sites of a square and never place a coarse one finer', () => {
    const observations = ['dune', 'dune', 'heath', 'island', 'gone'].map((siteId) =>
      anObservation({ siteId }),
    );
    const drawn = (characters: SquareCharacters) =>
      squaresOf(observations, sites, characters).map((square) => [
        square.locator,
        square.coarseOnly,
        square.observations.length,
      ]);
    // 57.2° N 8.1° E: field JO, square 47, subsquare be; worked out by hand.
    expect(drawn(6)).toEqual([
      ['JO46', true, 1],
      ['JO46ac', false, 2],
      ['JO47be', false, 1],
    ]);
    expect(drawn(4)).toEqual([
      ['JO46', false, 3],
      ['JO47', false, 1],
    ]);
    expect(drawn(2)).toEqual([['JO', false, 4]]);
  });
});

describe('placeOfSite', () => {
  it('should always draw a point in the square that holds it', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -90, max: 90, noNaN: true }),
        fc.double({ min: -180, max: 179.999, noNaN: true }),
        fc.constantFrom<SquareCharacters>(2, 4, 6),
        (latDeg, lonDeg, characters) => {
          const { locator, coarseOnly } = placeOfSite({ place: { latDeg, lonDeg } }, characters);
          const square = squareOf(locator);
          expect(locator).toHaveLength(characters);
          expect(coarseOnly).toBe(false);
          expect(latDeg).toBeGreaterThanOrEqual(square.southDeg - 1e-6);
          expect(latDeg).toBeLessThanOrEqual(square.northDeg + 1e-6);
          expect(lonDeg).toBeGreaterThanOrEqual(square.westDeg - 1e-6);
          expect(lonDeg).toBeLessThanOrEqual(square.eastDeg + 1e-6);
        },
      ),
    );
  });
});
