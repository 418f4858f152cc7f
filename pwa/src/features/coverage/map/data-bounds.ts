import { centreOf, squareOf, type LocatorSquare } from '@harkmoor/sync-model/radio/locator/locator';

/** The box around all places with data; null where there is none. */
export function dataBounds(locators: readonly string[]): LocatorSquare | null {
  if (locators.length === 0) return null;
  const squares = locators.map(squareOf);
  return {
    southDeg: Math.min(...squares.map(({ southDeg }) => southDeg)),
    westDeg: Math.min(...squares.map(({ westDeg }) => westDeg)),
    northDeg: Math.max(...squares.map(({ northDeg }) => northDeg)),
    eastDeg: Math.max(...squares.map(({ eastDeg }) => eastDeg)),
  };
}

/** Half the height and half the width of a closer look, in degrees. */
const REACH_LAT_DEG = 0.5;
const REACH_LON_DEG = 0.5;

/** The place with the most others close by; the first in order where several have as many. Null for none. */
export function densestPlace(locators: readonly string[]): string | null {
  const centres = [...locators].sort().map((locator) => ({ locator, ...centreOf(locator) }));
  let [best, most] = [null as string | null, 0];
  for (const { locator, latDeg, lonDeg } of centres) {
    const near = centres.filter(
      (other) =>
        Math.abs(other.latDeg - latDeg) <= REACH_LAT_DEG && Math.abs(other.lonDeg - lonDeg) <= REACH_LON_DEG,
    ).length;
    if (near > most) [best, most] = [locator, near];
  }
  return best;
}
