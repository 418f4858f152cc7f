import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { declinationDeg, magneticBearingDeg } from './declination.js';

const at = (latDeg: number, lonDeg: number) => ({ latDeg, lonDeg });
const yearMs = (year: number) => Date.UTC(Math.floor(year)) + (year % 1) * 365 * 86_400_000;

describe('the magnetic declination', () => {
  // NOAA's official test values WMM2025_TEST_VALUES, as transcribed in four public test files, to 0.01°.
  it.each([
    [2025.0, 0, 80, 0, 1.28],
    [2025.0, 0, 0, 120, -0.16],
    [2025.0, 100, 80, 0, 0.85],
    [2025.0, 100, -80, 240, 68.21],
    [2027.5, 0, 0, 120, -0.24],
  ])(
    'should be the official value of %f at %i km over %i, %i',
    (year, heightKm, latDeg, lonDeg, expectedDeg) => {
      const answer = declinationDeg(at(latDeg, lonDeg), yearMs(year), heightKm);
      expect(answer.kind === 'known' && Math.abs(answer.declinationDeg - expectedDeg) <= 0.0051).toBe(true);
    },
  );

  it('should be left unknown where a compass has nothing to hold on to', () => {
    // The WMM2025 north magnetic pole lies near 85.8° N, 139° E in 2025 (from memory).
    expect(declinationDeg(at(85.8, 139.3), yearMs(2025.5))).toEqual({
      kind: 'unknown',
      reason: 'near-magnetic-pole',
    });
  });

  it('should be marked where the field is weak', () => {
    const arctic = declinationDeg(at(75, -95), yearMs(2026));
    const temperate = declinationDeg(at(55.5, 8.2), yearMs(2026.9));
    expect(arctic.kind === 'known' && arctic.weakField).toBe(true);
    expect(temperate.kind === 'known' && temperate.weakField).toBe(false);
  });

  it.each([
    Date.UTC(1990, 0, 1),
    Date.UTC(2014, 11, 15, 6),
    Date.UTC(2029, 10, 13, 4),
    Date.UTC(2099, 0, 1),
    Number.NaN,
  ])('should be unknown when no model covers the date: %i', (atMs) => {
    expect(declinationDeg(at(55.5, 8.2), atMs)).toEqual({ kind: 'unknown', reason: 'model-expired' });
  });

  it('should never throw for a point on Earth at any instant a record may have', () => {
    const position = fc.record({
      latDeg: fc.double({ min: -90, max: 90, noNaN: true }),
      lonDeg: fc.double({ min: -180, max: 180, noNaN: true }),
    });
    const instant = fc.integer({ min: Date.UTC(1990, 0, 1), max: Date.UTC(2100, 0, 1) });
    fc.assert(
      fc.property(position, instant, (anywhere, atMs) => {
        const answer = declinationDeg(anywhere, atMs);
        if (answer.kind === 'known') expect(Math.abs(answer.declinationDeg)).toBeLessThanOrEqual(180);
      }),
    );
  });

  it('should be known from the first to the last instant of the models, without a gap', () => {
    const inside = fc.integer({ min: Date.UTC(2014, 11, 15, 7), max: Date.UTC(2029, 10, 13, 3) });
    fc.assert(
      fc.property(inside, (atMs) => {
        expect(declinationDeg(at(55.5, 8.2), atMs).kind).toBe('known');
      }),
      { examples: [[Date.UTC(2014, 11, 15, 7)], [Date.UTC(2029, 10, 13, 3)]] },
    );
  });
});

describe('a magnetic bearing', () => {
  it('should be the true one less an eastern declination', () => {
    expect(magneticBearingDeg(10, 25)).toBe(345);
    expect(magneticBearingDeg(350, -12)).toBe(2);
    expect(magneticBearingDeg(0, 0)).toBe(0);
  });
});
