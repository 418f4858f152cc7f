import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Position } from '../position.js';
import { nightRing } from './night-area.js';
import { subsolarPoint, sunAltitudeDeg } from './sun.js';

const anyInstant = fc.integer({ min: Date.UTC(1990, 0, 1), max: Date.UTC(2100, 0, 1) });

/** Crossing number on the flat map. */
function holds(ring: Position[], { latDeg, lonDeg }: Position): boolean {
  let inside = false;
  for (let index = 1; index < ring.length; index += 1) {
    const a = ring[index - 1]!;
    const b = ring[index]!;
    if (a.lonDeg > lonDeg === b.lonDeg > lonDeg) continue;
    const crossingDeg = a.latDeg + ((lonDeg - a.lonDeg) / (b.lonDeg - a.lonDeg)) * (b.latDeg - a.latDeg);
    if (crossingDeg > latDeg) inside = !inside;
  }
  return inside;
}

describe('the night side as a ring', () => {
  it('should always be closed and stay on the map', () => {
    fc.assert(
      fc.property(anyInstant, fc.constantFrom(1, 2, 7), (atMs, stepDeg) => {
        const ring = nightRing(atMs, stepDeg);
        expect(ring[0]).toEqual(ring.at(-1));
        for (const { latDeg, lonDeg } of ring) {
          expect(Math.abs(latDeg)).toBeLessThanOrEqual(90);
          expect(Math.abs(lonDeg)).toBeLessThanOrEqual(180);
        }
      }),
    );
  });

  it('should always run where the Sun is on the horizon', () => {
    fc.assert(
      fc.property(anyInstant, (atMs) => {
        for (const point of nightRing(atMs, 3).slice(0, -3)) {
          expect(Math.abs(sunAltitudeDeg(point, atMs))).toBeLessThan(0.001);
        }
      }),
    );
  });

  it('should always hold the points where the Sun is down, and no others', () => {
    const anywhere = fc.record({
      latDeg: fc.double({ min: -89, max: 89, noNaN: true }),
      lonDeg: fc.double({ min: -179, max: 179, noNaN: true }),
    });
    fc.assert(
      fc.property(anyInstant, anywhere, (atMs, point) => {
        const altitudeDeg = sunAltitudeDeg(point, atMs);
        // Between two points of the ring the flat map cuts a corner of less than 0.3 degrees; beside a pole, where
        // one step of arc spans many longitudes, of up to that step of 2 degrees.
        fc.pre(Math.abs(altitudeDeg) > (Math.abs(point.latDeg) > 80 ? 2 : 0.3));
        expect(holds(nightRing(atMs, 2), point)).toBe(altitudeDeg < 0);
      }),
      { numRuns: 1000, examples: [[2026479770089, { latDeg: -88.99999992670315, lonDeg: 0 }]] },
    );
  });

  it('should be close to a pair of meridians at an equinox', () => {
    // 2026-03-20 14:45:36 UTC, reproduced with astronomy-engine.
    const atMs = Date.parse('2026-03-20T14:45:36Z');
    const sun = subsolarPoint(atMs);
    const temperate = nightRing(atMs, 2)
      .slice(1, -4)
      .filter(({ latDeg }) => Math.abs(latDeg) < 80);
    expect(temperate.length).toBeGreaterThan(150);
    for (const { lonDeg } of temperate) {
      const fromSunDeg = Math.abs(lonDeg - sun.lonDeg);
      expect(Math.abs(Math.min(fromSunDeg, 360 - fromSunDeg) - 90)).toBeLessThan(0.1);
    }
  });

  it('should refuse a step that makes no ring', () => {
    expect(() => nightRing(0, 0)).toThrow('step');
    expect(() => nightRing(0, Number.NaN)).toThrow('step');
  });
});
