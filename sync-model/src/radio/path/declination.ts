import geomagnetism from 'geomagnetism';
import { assertPosition, wrapBearingDeg, type Position } from '../position.js';

/** The declination in degrees, east positive, or why there is none. `weakField`: a compass may be sluggish and wrong. */
export type Declination =
  | { kind: 'known'; declinationDeg: number; weakField: boolean }
  | { kind: 'unknown'; reason: 'model-expired' | 'near-magnetic-pole' };

/** From memory of the World Magnetic Model's report: caution below 6 000 nT of horizontal field, blackout below 2 000. */
const CAUTION_NT = 6000;
const BLACKOUT_NT = 2000;
/** The dates of the models in the package, WMM2015 to WMM2025: it throws outside them. */
const FIRST_AT_MS = Date.UTC(2014, 11, 15, 7);
const LAST_AT_MS = Date.UTC(2029, 10, 13, 3);

/**
 * The angle from true to magnetic north by the World Magnetic Model of that date. `model-expired` is the answer
 * for every date that no model covers (before 15 December 2014 and after 13 November 2029): then only
 * true bearings can be shown. Each call builds the model anew (some 70 µs), and the file brings the coefficients of four
 * models (27 kB): load it where a compass bearing is shown.
 */
export function declinationDeg(position: Position, atMs: number, heightKm = 0): Declination {
  assertPosition(position);
  if (!(atMs >= FIRST_AT_MS && atMs <= LAST_AT_MS)) return { kind: 'unknown', reason: 'model-expired' };
  const field = geomagnetism.model(new Date(atMs)).point([position.latDeg, position.lonDeg, heightKm]);
  if (field.h < BLACKOUT_NT) return { kind: 'unknown', reason: 'near-magnetic-pole' };
  return { kind: 'known', declinationDeg: field.decl, weakField: field.h < CAUTION_NT };
}

/** The bearing that a compass shows for a true bearing: true less declination, 0 up to 360 degrees. */
export function magneticBearingDeg(trueDeg: number, declinationDeg: number): number {
  return wrapBearingDeg(trueDeg - declinationDeg);
}
