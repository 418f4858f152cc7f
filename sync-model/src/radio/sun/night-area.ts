import { wrapLonDeg, type Position } from '../position.js';
import { subsolarPoint } from './sun.js';

/** Closer to an equinox than this the terminator would run straight through the poles and have no dark side to fill. */
const LEAST_TILT_DEG = 1e-6;
const RAD = Math.PI / 180;

/**
 * The night side of the Earth (Sun's centre below the horizon, altitude 0, no refraction) as a closed ring that a flat map from
 * −180 to 180 degrees of longitude can fill. It runs along the terminator from west to east in steps of
 * `stepDeg` of arc, then along the map's edges past the pole that is in the dark; the last point is the first again.
 */
export function nightRing(atMs: number, stepDeg: number): Position[] {
  if (!(stepDeg > 0 && stepDeg <= 45))
    throw new Error(`A step lies between 0 and 45 degrees, not ${stepDeg}.`);
  const sun = tilted(subsolarPoint(atMs));
  const darkPoleDeg = sun.latDeg > 0 ? -90 : 90;
  const edgeDeg = terminatorLatDeg(sun, 180);
  const inner = terminatorCircle(sun, stepDeg).sort((a, b) => a.lonDeg - b.lonDeg);
  const start = { latDeg: edgeDeg, lonDeg: -180 };
  return [
    start,
    ...inner,
    { latDeg: edgeDeg, lonDeg: 180 },
    { latDeg: darkPoleDeg, lonDeg: 180 },
    { latDeg: darkPoleDeg, lonDeg: -180 },
    { ...start },
  ];
}

function tilted(sun: Position): Position {
  if (Math.abs(sun.latDeg) >= LEAST_TILT_DEG) return sun;
  return { ...sun, latDeg: sun.latDeg < 0 ? -LEAST_TILT_DEG : LEAST_TILT_DEG };
}

/** Points 90° from the point under the Sun, evenly spaced along that circle, so that its steep parts are as smooth as the rest. */
function terminatorCircle(sun: Position, stepDeg: number): Position[] {
  const count = Math.ceil(360 / stepDeg);
  const sinSun = Math.sin(sun.latDeg * RAD);
  const cosSun = Math.cos(sun.latDeg * RAD);
  return Array.from({ length: count }, (_, index) => {
    const direction = (2 * Math.PI * index) / count;
    const latDeg = Math.asin(cosSun * Math.cos(direction)) / RAD;
    const eastDeg = Math.atan2(Math.sin(direction), -sinSun * Math.cos(direction)) / RAD;
    return { latDeg, lonDeg: wrapLonDeg(sun.lonDeg + eastDeg) };
  });
}

/** Where the terminator crosses a meridian: tan(latitude) = −cos(hour angle) / tan(declination). */
function terminatorLatDeg(sun: Position, lonDeg: number): number {
  return Math.atan(-Math.cos((lonDeg - sun.lonDeg) * RAD) / Math.tan(sun.latDeg * RAD)) / RAD;
}
