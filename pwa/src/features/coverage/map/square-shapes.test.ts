import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { aSquare } from '../testing/invented-squares';
import { rectOf, squareAt, squareShapes } from './square-shapes';
import { charactersAtZoom, fillOf } from './square-scale';
import { firstSquare, nextSquare, type Direction } from './square-cursor';

describe('a point on the map', () => {
  const fine = aSquare({ locator: 'JO46ac' });
  const coarse = aSquare({ locator: 'JO46', coarseOnly: true });

  it('should choose the finest square with data there', () => {
    expect(squareAt([coarse, fine], { latDeg: 56.1, lonDeg: 8.03 }, 6)).toBe(fine);
    expect(squareAt([coarse, fine], { latDeg: 56.8, lonDeg: 9.5 }, 6)).toBe(coarse);
    expect(squareAt([coarse, fine], { latDeg: 50, lonDeg: 9.5 }, 6)).toBeNull();
  });

  it('should choose the same square in another copy of the world', () => {
    expect(squareAt([fine], { latDeg: 56.1, lonDeg: 8.03 + 360 }, 6)).toBe(fine);
    expect(squareAt([fine], { latDeg: 89, lonDeg: 8.03 }, 6)).toBeNull();
  });
});

describe('the fill of a square', () => {
  it('should print tens of per cent, and nothing where there is no rate', () => {
    expect(fillOf(aSquare({ heard: 58, n: 70 }), 'rate', 70)).toMatchObject({ print: '8', isThin: false });
    expect(fillOf(aSquare({ heard: 0, n: 0 }), 'rate', 70)).toMatchObject({ share: null, print: '' });
  });

  it('should put the largest count at the top of the ramp and one at its foot', () => {
    expect(fillOf(aSquare({ n: 500, heard: 1 }), 'count', 500).share).toBeCloseTo(1);
    expect(fillOf(aSquare({ n: 1, heard: 1 }), 'count', 500).share).toBe(0);
  });

  it('should say that few dates are thin', () => {
    expect(fillOf(aSquare({ n: 9, heard: 5, dates: 2 }), 'rate', 9).isThin).toBe(true);
  });

  it('should be of fields, four and six characters by zoom', () => {
    expect([1, 5, 6, 8, 9, 12].map(charactersAtZoom)).toEqual([2, 2, 4, 4, 6, 6]);
  });

  it('should lie above the dashed outlines', () => {
    const shapes = squareShapes(
      [aSquare({ locator: 'JO46ac' }), aSquare({ locator: 'JO46', coarseOnly: true })],
      'rate',
    );
    expect(shapes.map(({ figures }) => figures.locator)).toEqual(['JO46', 'JO46ac']);
  });
});

describe('the cursor of the keyboard', () => {
  const locators = ['JO45', 'JO46', 'JO56', 'JO66', 'JO77'];
  const directions: Direction[] = ['left', 'right', 'up', 'down'];

  it('should go to the neighbour, over gaps, and stay at the edge', () => {
    expect(nextSquare(locators, 'JO46', 'right')).toBe('JO56');
    expect(nextSquare(locators, 'JO46', 'down')).toBe('JO45');
    expect(nextSquare(locators, 'JO66', 'up')).toBe('JO77');
    expect(nextSquare(locators, 'JO46', 'left')).toBe('JO46');
  });

  it('should begin in the north-west', () => {
    expect(nextSquare(locators, null, 'right')).toBe(firstSquare(locators));
    expect(nextSquare([], null, 'right')).toBeNull();
  });

  it('should always move ahead or stay, and only to squares with data', () => {
    fc.assert(
      fc.property(fc.constantFrom(...locators), fc.constantFrom(...directions), (from, direction) => {
        const to = nextSquare(locators, from, direction)!;
        expect(locators).toContain(to);
        const [a, b] = [rectOf(from), rectOf(to)];
        if (direction === 'right') expect(b.x0).toBeGreaterThanOrEqual(a.x0);
        if (direction === 'up') expect(b.y0).toBeLessThanOrEqual(a.y0);
      }),
    );
  });
});
