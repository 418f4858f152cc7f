import * as suncalc from 'suncalc';
import { assertPosition, wrapLonDeg, type Position } from '../position.js';

/** From light to dark. */
export type Twilight = 'day' | 'civil' | 'nautical' | 'astronomical' | 'night';

/**
 * Altitudes of the Sun's centre at which a state ends, in degrees (standard definitions, from memory): sunrise
 * and sunset are 34′ of refraction and 16′ of radius below the horizon; the twilights need no refraction.
 */
export const SUNRISE_DEG = -0.833;
const LOWEST_DEG: readonly [Twilight, number][] = [
  ['day', SUNRISE_DEG],
  ['civil', -6],
  ['nautical', -12],
  ['astronomical', -18],
];

const OVERHEAD_STEP_DEG = 1e-5;
const MINUTE_MS = 60_000;
const SEARCH_MS = 48 * 60 * MINUTE_MS;
const SEARCH_STEP_MS = 2 * MINUTE_MS;
const DAY_MS = 24 * 60 * MINUTE_MS;

/**
 * The altitude of the Sun's centre above the horizon in degrees, without refraction: what twilight and the
 * propagation formulas are defined by.
 */
export function sunAltitudeDeg(position: Position, atMs: number): number {
  assertPosition(position);
  const { latDeg, lonDeg } = position;
  const apparentDeg = suncalc.getPosition(new Date(atMs), latDeg, lonDeg).altitude;
  if (!Number.isNaN(apparentDeg)) return withoutRefractionDeg(apparentDeg);
  // Exactly overhead or below, the library takes the arcsine of a hair more than 1: ask a metre to the side.
  const besideDeg = latDeg > 0 ? latDeg - OVERHEAD_STEP_DEG : latDeg + OVERHEAD_STEP_DEG;
  return withoutRefractionDeg(suncalc.getPosition(new Date(atMs), besideDeg, lonDeg).altitude);
}

/** The direction to the Sun in degrees clockwise from true north, 0 up to 360. */
export function sunAzimuthDeg(position: Position, atMs: number): number {
  assertPosition(position);
  return suncalc.getPosition(new Date(atMs), position.latDeg, position.lonDeg).azimuth % 360;
}

/** The refraction that the library adds to an altitude (Meeus 16.4; below the horizon it stays that of 0°). */
function refractionDeg(altitudeDeg: number): number {
  const rad = Math.PI / 180;
  const altitude = Math.max(0, altitudeDeg * rad);
  return 0.0002967 / Math.tan(altitude + 0.00312536 / (altitude + 0.08901179)) / rad;
}

/** Undoes `refractionDeg`: the library gives the apparent altitude only. Eight rounds are exact to a millionth of a degree. */
function withoutRefractionDeg(apparentDeg: number): number {
  let altitudeDeg = apparentDeg - refractionDeg(apparentDeg);
  for (let round = 0; round < 8; round += 1) altitudeDeg = apparentDeg - refractionDeg(altitudeDeg);
  return altitudeDeg;
}

/** The state of the day where the Sun stands this high: a limit belongs to the lighter state. */
export function twilightOfAltitude(altitudeDeg: number): Twilight {
  return LOWEST_DEG.find(([, lowestDeg]) => altitudeDeg >= lowestDeg)?.[0] ?? 'night';
}

/** Day, one of the three twilights or night at a point and an instant. */
export function twilightAt(position: Position, atMs: number): Twilight {
  return twilightOfAltitude(sunAltitudeDeg(position, atMs));
}

/**
 * The first instant after `atMs`, to a millisecond, at which the state of the day is another, and that state. Null
 * where it stays the same for 48 hours, as in polar day and night. A state that lasts less than two
 * minutes may be missed.
 */
export function nextTwilightChange(position: Position, atMs: number): { atMs: number; to: Twilight } | null {
  const from = twilightAt(position, atMs);
  for (let after = SEARCH_STEP_MS; after <= SEARCH_MS; after += SEARCH_STEP_MS) {
    if (twilightAt(position, atMs + after) === from) continue;
    let same = atMs + after - SEARCH_STEP_MS;
    let changed = atMs + after;
    while (changed - same > 1) {
      const middle = Math.floor((same + changed) / 2);
      if (twilightAt(position, middle) === from) same = middle;
      else changed = middle;
    }
    return { atMs: changed, to: twilightAt(position, changed) };
  }
  return null;
}

/** An instant, or that the Sun stays above or below the altitude in question for the whole day. */
export type SunTime = number | 'up all day' | 'down all day';

export type SunTimes = {
  noonAtMs: number;
  sunrise: SunTime;
  sunset: SunTime;
  civilDawn: SunTime;
  civilDusk: SunTime;
  nauticalDawn: SunTime;
  nauticalDusk: SunTime;
  astronomicalDawn: SunTime;
  astronomicalDusk: SunTime;
};

/**
 * Sunrise, sunset and twilights of the solar day whose noon falls on the UTC date that holds `utcDayMs`. At
 * longitudes far from Greenwich they may fall on the dates beside it. "up all day" for a dusk of −18° means that
 * the Sun stays above −18°: no night.
 */
export function sunTimes(position: Position, utcDayMs: number): SunTimes {
  assertPosition(position);
  const middayMs = Math.floor(utcDayMs / DAY_MS) * DAY_MS + DAY_MS / 2;
  const found = suncalc.getTimes(new Date(middayMs), position.latDeg, position.lonDeg);
  const noonAtMs = found.solarNoon.getTime();
  const highestDeg = sunAltitudeDeg(position, noonAtMs);
  const timeOf = (time: Date | null, limitDeg: number): SunTime =>
    time?.getTime() ?? (highestDeg > limitDeg ? 'up all day' : 'down all day');
  return {
    noonAtMs,
    sunrise: timeOf(found.sunrise, SUNRISE_DEG),
    sunset: timeOf(found.sunset, SUNRISE_DEG),
    civilDawn: timeOf(found.dawn, -6),
    civilDusk: timeOf(found.dusk, -6),
    nauticalDawn: timeOf(found.nauticalDawn, -12),
    nauticalDusk: timeOf(found.nauticalDusk, -12),
    astronomicalDawn: timeOf(found.nightEnd, -18),
    astronomicalDusk: timeOf(found.night, -18),
  };
}

/**
 * The point under the Sun. Seen from the north pole the Sun's altitude is its declination, and its azimuth,
 * counted from the meridian of Greenwich, its hour angle there.
 */
export function subsolarPoint(atMs: number): Position {
  const { altitude, azimuth } = suncalc.getPosition(new Date(atMs), 90, 0);
  return { latDeg: withoutRefractionDeg(altitude), lonDeg: wrapLonDeg(180 - azimuth) };
}
