import geodesic from 'geographiclib-geodesic';
import { assertPosition, wrapBearingDeg, type Position } from '../position.js';

/**
 * The short and the long way between two points on WGS84: distances in km, bearings in degrees from true
 * north, 0 up to 360. The bearing is the direction to the far point as seen from the first, the back bearing
 * the direction from the far point to the first.
 */
export type Path = {
  distanceKm: number;
  bearingDeg: number;
  backBearingDeg: number;
  longDistanceKm: number;
  longBearingDeg: number;
};

/** The circumference of a meridian of WGS84: twice the 20 003.931 km from pole to pole. */
const MERIDIAN_KM = 40_007.863;

/**
 * The geodesic between two points (Karney's solver: exact to nanometres, and it also converges where the
 * points are nearly antipodal). The long way is "about": on an ellipsoid the geodesic carried on does not
 * come back to its start, so its length is the meridian's circumference less the short way.
 * Two equal points have distance 0 and bearing 0.
 */
export function pathBetween(from: Position, to: Position): Path {
  assertPosition(from);
  assertPosition(to);
  const line = geodesic.Geodesic.WGS84.Inverse(from.latDeg, from.lonDeg, to.latDeg, to.lonDeg);
  const distanceKm = known(line.s12) / 1000;
  const bearingDeg = wrapBearingDeg(known(line.azi1));
  return {
    distanceKm,
    bearingDeg,
    // The solver's second azimuth still looks forward.
    backBearingDeg: wrapBearingDeg(known(line.azi2) + 180),
    longDistanceKm: MERIDIAN_KM - distanceKm,
    longBearingDeg: wrapBearingDeg(bearingDeg + 180),
  };
}

/** The point half way along the short path. */
export function midpointOf(from: Position, to: Position): Position {
  return pointsAlong(from, to, 2)[1] ?? from;
}

/**
 * Points that cut the short path into so many equal legs, both ends included: a map draws straight lines, so a
 * great circle has to be given in pieces. Longitudes are between −180 and 180 degrees.
 */
export function pointsAlong(from: Position, to: Position, legs: number): Position[] {
  assertPosition(from);
  assertPosition(to);
  if (!Number.isInteger(legs) || legs < 1) throw new Error(`A path has at least one leg, not ${legs}.`);
  const line = geodesic.Geodesic.WGS84.InverseLine(from.latDeg, from.lonDeg, to.latDeg, to.lonDeg);
  return Array.from({ length: legs + 1 }, (_, index) => {
    const { lat2, lon2 } = line.Position((line.s13 * index) / legs);
    return { latDeg: known(lat2), lonDeg: known(lon2) };
  });
}

function known(value: number | undefined): number {
  if (value === undefined) throw new Error('The geodesic solver left out a value that was asked for.');
  return value;
}
