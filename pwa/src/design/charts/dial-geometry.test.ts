import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { arcPath, cellPath, pointAt, ringRadii } from './dial-geometry';
import { steppedCell } from './dial-keys';

describe('the round of 24 hours', () => {
  it('should have noon at the top, 18 UTC at the right, midnight below', () => {
    const near = ({ x, y }: { x: number; y: number }) =>
      [Math.round(x), Math.round(y)].map((each) => each + 0);
    expect(near(pointAt(100, 12))).toEqual([0, -100]);
    expect(near(pointAt(100, 18))).toEqual([100, 0]);
    expect(near(pointAt(100, 0))).toEqual([0, 100]);
    expect(near(pointAt(100, 6))).toEqual([-100, 0]);
  });

  it('should always fill the rings from the inner to the outer radius without a gap', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 12 }), (rings) => {
        const radii = Array.from({ length: rings }, (_, ring) => ringRadii(ring, rings, 50, 142));
        expect(radii[0]![0]).toBe(50);
        expect(radii.at(-1)![1]).toBeCloseTo(142);
        radii.slice(1).forEach(([inner], index) => expect(inner).toBeCloseTo(radii[index]![1]));
      }),
    );
  });

  it('should keep every corner of a thin cell within the cell', () => {
    const cell = { fromHour: 15, toHour: 16, inner: 60, outer: 80 };
    const radii = corners(cellPath(cell, 0, true)).map(([x, y]) => Math.hypot(x, y));
    expect(Math.min(...radii)).toBeCloseTo(65, 1);
    expect(Math.max(...radii)).toBeCloseTo(75, 1);
  });

  it('should go the long way round for a night longer than half a day', () => {
    expect(arcPath(100, 16, 32)).toContain(' 0 1 1 ');
    expect(arcPath(100, 8, 16)).toContain(' 0 0 1 ');
  });
});

describe('the keys of the dial', () => {
  it('should go round the clock and stop at the first and last ring', () => {
    expect(steppedCell({ ring: 0, hour: 23 }, 'ArrowRight', 3)).toEqual({ ring: 0, hour: 0 });
    expect(steppedCell({ ring: 2, hour: 0 }, 'ArrowUp', 3)).toEqual({ ring: 2, hour: 0 });
    expect(steppedCell({ ring: 0, hour: 0 }, 'ArrowLeft', 3)).toEqual({ ring: 0, hour: 23 });
  });

  it('should begin at noon of the outer ring, and leave other keys alone', () => {
    expect(steppedCell(null, 'ArrowUp', 3)).toEqual({ ring: 2, hour: 12 });
    expect(steppedCell(null, 'Tab', 3)).toBeNull();
    expect(steppedCell(null, 'ArrowUp', 0)).toBeNull();
  });
});

/** The points that a path moves or draws a line to. */
function corners(path: string): [number, number][] {
  return [...path.matchAll(/[ML](-?[\d.]+) (-?[\d.]+)/g)].map(([, x, y]) => [Number(x), Number(y)]);
}
