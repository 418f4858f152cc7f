import { describe, expect, it } from 'vitest';
import { unwrapRing } from './unwrap-ring';

describe('an outline over the 180th meridian', () => {
  it('should run on past 180 degrees and never jump', () => {
    const ring = unwrapRing([
      [170, 60],
      [179, 62],
      [-179, 64],
      [-170, 61],
      [170, 60],
    ]);
    expect(ring.map(([lonDeg]) => lonDeg)).toEqual([170, 179, 181, 190, 170]);
  });

  it('should be closed along the pole that it goes round', () => {
    const ring = unwrapRing([
      [-170, -70],
      [-60, -75],
      [60, -70],
      [170, -72],
      [-170, -70],
    ]);
    expect(ring.slice(-3)).toEqual([
      [190, -90],
      [-170, -90],
      [-170, -70],
    ]);
  });
});
