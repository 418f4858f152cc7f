import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  nextTwilightChange,
  subsolarPoint,
  sunAltitudeDeg,
  sunAzimuthDeg,
  twilightAt,
  twilightOfAltitude,
} from './sun.js';

const at = (latDeg: number, lonDeg: number) => ({ latDeg, lonDeg });
const NREL_POINT = at(39.742476, -105.1786);
const GREENWICH = at(51.4779, 0);
const MINUTE_MS = 60_000;
const anyPosition = fc.record({
  latDeg: fc.double({ min: -90, max: 90, noNaN: true }),
  lonDeg: fc.double({ min: -180, max: 180, noNaN: true }),
});
const anyInstant = fc.integer({ min: Date.UTC(1990, 0, 1), max: Date.UTC(2100, 0, 1) });

describe('the position of the Sun', () => {
  it('should be that of the worked example of NREL\u2019s algorithm', () => {
    // Reda & Andreas, NREL/TP-560-34302, values as in the pvlib tests: e0 39.872046 (no refraction), azimuth 194.340241.
    const exampleMs = Date.UTC(2003, 9, 17, 19, 30, 30);
    expect(Math.abs(sunAltitudeDeg(NREL_POINT, exampleMs) - 39.872046)).toBeLessThan(0.01);
    expect(Math.abs(sunAzimuthDeg(NREL_POINT, exampleMs) - 194.340241)).toBeLessThan(0.01);
  });

  it('should have the declination and hour angle of the same example under the Sun', () => {
    // Geocentric declination −9.31434, hour angle H 11.10590 at longitude −105.1786.
    const sun = subsolarPoint(Date.UTC(2003, 9, 17, 19, 30, 30));
    expect(Math.abs(sun.latDeg - -9.31434)).toBeLessThan(0.01);
    expect(Math.abs(sun.lonDeg - (-105.1786 - 11.1059))).toBeLessThan(0.01);
  });

  // Equinoxes and solstices of 2026: reproduced with astronomy-engine; the minutes are those of printed almanacs, from memory.
  it.each([
    ['2026-03-20T14:45:36Z', 0],
    ['2026-06-21T08:25:00Z', 23.44],
    ['2026-09-23T00:05:39Z', 0],
    ['2026-12-21T20:50:22Z', -23.44],
  ])('should stand over latitude %s at %f', (instant, latDeg) => {
    expect(Math.abs(subsolarPoint(Date.parse(instant)).latDeg - latDeg)).toBeLessThan(0.01);
  });

  it('should stand near 23.44 N, 0.5 E at noon of the June solstice', () => {
    // Calculated with an equation of time of about −1.8 minutes.
    const sun = subsolarPoint(Date.UTC(2026, 5, 21, 12));
    expect(sun.latDeg).toBeCloseTo(23.44, 1);
    expect(sun.lonDeg).toBeCloseTo(0.47, 1);
  });

  it('should always be overhead at the point under the Sun and at nadir opposite', () => {
    fc.assert(
      fc.property(anyInstant, (atMs) => {
        const sun = subsolarPoint(atMs);
        const opposite = at(-sun.latDeg, sun.lonDeg > 0 ? sun.lonDeg - 180 : sun.lonDeg + 180);
        expect(sunAltitudeDeg(sun, atMs)).toBeGreaterThan(89.99);
        expect(sunAltitudeDeg(opposite, atMs)).toBeLessThan(-89.99);
      }),
      { numRuns: 1000, examples: [[1626286132662]] },
    );
  });

  it('should always be as high as spherical trigonometry from the point under it says', () => {
    const rad = Math.PI / 180;
    fc.assert(
      fc.property(anyPosition, anyInstant, (position, atMs) => {
        const sun = subsolarPoint(atMs);
        const sine =
          Math.sin(position.latDeg * rad) * Math.sin(sun.latDeg * rad) +
          Math.cos(position.latDeg * rad) *
            Math.cos(sun.latDeg * rad) *
            Math.cos((position.lonDeg - sun.lonDeg) * rad);
        expect(Math.abs(Math.sin(sunAltitudeDeg(position, atMs) * rad) - sine)).toBeLessThan(1e-6);
        const azimuthDeg = sunAzimuthDeg(position, atMs);
        expect(azimuthDeg >= 0 && azimuthDeg < 360).toBe(true);
      }),
    );
  });
});

describe('the state of the day', () => {
  // The limits of the standard definitions, from memory: −0.833, −6, −12 and −18 degrees.
  it.each([
    [10, 'day'],
    [-0.833, 'day'],
    [-0.834, 'civil'],
    [-6, 'civil'],
    [-6.001, 'nautical'],
    [-12.001, 'astronomical'],
    [-18, 'astronomical'],
    [-18.001, 'night'],
  ] as const)('should be, at %f degrees, %s', (altitudeDeg, state) => {
    expect(twilightOfAltitude(altitudeDeg)).toBe(state);
  });

  // Greenwich on 2026-06-21: reproduced with astronomy-engine: civil dawn 02:55:03, nautical 01:40:37, no night.
  it.each([
    ['2026-06-21T01:40:00Z', 'astronomical'],
    ['2026-06-21T01:41:30Z', 'nautical'],
    ['2026-06-21T02:54:00Z', 'nautical'],
    ['2026-06-21T02:56:00Z', 'civil'],
    ['2026-06-21T03:42:00Z', 'civil'],
    ['2026-06-21T03:43:30Z', 'day'],
  ])('should be at Greenwich at %s %s', (instant, state) => {
    expect(twilightAt(GREENWICH, Date.parse(instant))).toBe(state);
  });

  it('should change at the civil dusk that another library gives', () => {
    // astronomy-engine: sunset 20:20:50, civil dusk 21:08:35, nautical dusk 22:23:01.
    const sunset = nextTwilightChange(GREENWICH, Date.UTC(2026, 5, 21, 12));
    expect(sunset?.to).toBe('civil');
    expect(Math.abs((sunset?.atMs ?? 0) - Date.parse('2026-06-21T20:20:50Z'))).toBeLessThan(MINUTE_MS);
    const civilDusk = nextTwilightChange(GREENWICH, sunset?.atMs ?? 0);
    expect(civilDusk?.to).toBe('nautical');
    expect(Math.abs((civilDusk?.atMs ?? 0) - Date.parse('2026-06-21T21:08:35Z'))).toBeLessThan(MINUTE_MS);
  });

  it('should not change within two days in polar day and polar night at the pole', () => {
    expect(nextTwilightChange(at(90, 0), Date.UTC(2026, 5, 21))).toBeNull();
    expect(nextTwilightChange(at(90, 0), Date.UTC(2026, 11, 21))).toBeNull();
  });

  it('should always be the old state until the change and the new one at it', () => {
    fc.assert(
      fc.property(anyPosition, anyInstant, (position, atMs) => {
        const change = nextTwilightChange(position, atMs);
        if (!change) {
          expect(Math.abs(position.latDeg)).toBeGreaterThan(45);
          return;
        }
        expect(change.to).not.toBe(twilightAt(position, atMs));
        expect(change.to).toBe(twilightAt(position, change.atMs));
        expect(twilightAt(position, change.atMs - 1)).toBe(twilightAt(position, atMs));
        expect(change.atMs - atMs).toBeLessThanOrEqual(48 * 60 * MINUTE_MS);
      }),
    );
  });
});
