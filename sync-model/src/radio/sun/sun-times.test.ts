import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { sunAltitudeDeg, sunTimes, type SunTime } from './sun.js';

const at = (latDeg: number, lonDeg: number) => ({ latDeg, lonDeg });
const NREL_POINT = at(39.742476, -105.1786);
const GREENWICH = at(51.4779, 0);
const FAR_NORTH = at(69.65, 18.96);
const MINUTE_MS = 60_000;
const anyPosition = fc.record({
  latDeg: fc.double({ min: -90, max: 90, noNaN: true }),
  lonDeg: fc.double({ min: -180, max: 180, noNaN: true }),
});
const anyInstant = fc.integer({ min: Date.UTC(1990, 0, 1), max: Date.UTC(2100, 0, 1) });

function within(time: SunTime, expected: string, toleranceMs: number): void {
  expect(
    typeof time === 'number' ? Math.abs(time - Date.parse(expected)) : time,
    expected,
  ).toBeLessThanOrEqual(toleranceMs);
}

describe('sunrise and sunset', () => {
  // USNO, quoted by pvlib's tests, in minutes of local time (UTC−7), reproduced with astronomy-engine.
  it.each([
    ['2015-01-02', '2015-01-02T14:19:00Z', '2015-01-02T23:49:00Z'],
    ['2015-04-02', '2015-04-02T12:43:00Z', '2015-04-03T01:24:00Z'],
    ['2015-12-02', '2015-12-02T14:01:00Z', '2015-12-02T23:38:00Z'],
  ])('should be those of the naval almanac at 39 N, 105 W on %s', (day, sunrise, sunset) => {
    const times = sunTimes(at(39, -105), Date.parse(day));
    within(times.sunrise, sunrise, MINUTE_MS);
    within(times.sunset, sunset, MINUTE_MS);
  });

  // Table in the report on NREL's algorithm, as in pvlib's tests.
  it.each([
    [35, '1994-01-02', '1994-01-02T07:08:12Z', '1994-01-02T16:59:55Z'],
    [-35, '2004-12-04', '2004-12-04T04:38:57Z', '2004-12-04T19:02:02Z'],
  ])('should be those of NREL\u2019s table at latitude %i', (latDeg, day, sunrise, sunset) => {
    const times = sunTimes(at(latDeg, 0), Date.parse(day));
    within(times.sunrise, sunrise, 15_000);
    within(times.sunset, sunset, 15_000);
  });

  it('should be those of NREL\u2019s example day, with the sunset of its own evening', () => {
    // astronomy-engine at height 0: 06:12:44 and 17:18:51 local; the printed 17:20:19 is the evening before.
    const times = sunTimes(NREL_POINT, Date.UTC(2003, 9, 17));
    within(times.sunrise, '2003-10-17T13:12:44Z', 5000);
    within(times.sunset, '2003-10-18T00:18:51Z', 5000);
    within(sunTimes(NREL_POINT, Date.UTC(2003, 9, 16)).sunset, '2003-10-17T00:20:19Z', 5000);
  });

  it('should tell the twilights, and that there is no night', () => {
    // Greenwich, 2026-06-21, astronomy-engine.
    const times = sunTimes(GREENWICH, Date.UTC(2026, 5, 21));
    within(times.sunrise, '2026-06-21T03:42:47Z', 15_000);
    within(times.civilDawn, '2026-06-21T02:55:03Z', 15_000);
    within(times.nauticalDawn, '2026-06-21T01:40:37Z', 15_000);
    within(times.nauticalDusk, '2026-06-21T22:23:01Z', 15_000);
    expect(times.astronomicalDawn).toBe('up all day');
    expect(times.astronomicalDusk).toBe('up all day');
  });

  it('should be words instead of a time where the Sun does not rise or set', () => {
    const summer = sunTimes(FAR_NORTH, Date.UTC(2026, 5, 21));
    const winter = sunTimes(FAR_NORTH, Date.UTC(2026, 11, 21));
    expect([summer.sunrise, summer.sunset]).toEqual(['up all day', 'up all day']);
    expect([winter.sunrise, winter.sunset]).toEqual(['down all day', 'down all day']);
    expect(typeof winter.civilDawn).toBe('number');
  });

  it('should not depend on the time within the UTC date', () => {
    const dates = fc.integer({ min: 0, max: 40_000 });
    const within24h = fc.integer({ min: 0, max: 86_399_999 });
    fc.assert(
      fc.property(anyPosition, dates, within24h, (position, date, laterMs) => {
        const dayMs = Date.UTC(1990, 0, 1) + date * 86_400_000;
        expect(sunTimes(position, dayMs + laterMs)).toEqual(sunTimes(position, dayMs));
        expect(Math.abs(sunTimes(position, dayMs).noonAtMs - (dayMs + 43_200_000))).toBeLessThan(
          12.4 * 3_600_000,
        );
      }),
    );
  });

  it('should always stand at the altitude that defines it', () => {
    const temperate = fc.record({
      latDeg: fc.double({ min: -55, max: 55, noNaN: true }),
      lonDeg: fc.double({ min: -180, max: 180, noNaN: true }),
    });
    fc.assert(
      fc.property(temperate, anyInstant, (position, atMs) => {
        const { sunrise, sunset, civilDusk } = sunTimes(position, atMs);
        for (const [time, altitudeDeg] of [
          [sunrise, -0.833],
          [sunset, -0.833],
          [civilDusk, -6],
        ] as const) {
          if (typeof time !== 'number') throw new Error('The Sun rises and sets here every day.');
          expect(Math.abs(sunAltitudeDeg(position, time) - altitudeDeg)).toBeLessThan(0.02);
        }
      }),
    );
  });
});
