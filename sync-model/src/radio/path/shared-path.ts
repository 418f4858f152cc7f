import type { Place, Site } from '../../records/site.js';
import { centreOf, locatorOf } from '../locator/locator.js';
import type { Position } from '../position.js';
import { pathBetween, type Path } from './path.js';

/** How much of a place others see: the characters of its locator square, or the exact point. */
export type ShareCharacters = 4 | 6 | 8;

/** A path that may be shown to others; `roundedToKm` is null where the owner shared the exact point. */
export type SharedPath = Path & { roundedToKm: 10 | 100 | null };

/** The point that stands for a place before others: the centre of its square, or the exact point its owner shared. */
export function sharedPosition(place: Place): Position {
  if ('locator' in place) return centreOf(place.locator);
  return { latDeg: place.latDeg, lonDeg: place.lonDeg };
}

/**
 * The path from a place as others may see it. It is computed from the shared square alone, so it is the
 * same for every exact point in it; distances are rounded to 10 km at six and eight characters and to 100 km
 * at four, bearings to whole degrees. From an exactly shared point nothing is rounded.
 */
export function sharedPath(place: Place, to: Position): SharedPath {
  const path = pathBetween(sharedPosition(place), to);
  if (!('locator' in place)) return { ...path, roundedToKm: null };
  const roundedToKm = place.locator.length <= 4 ? 100 : 10;
  return {
    distanceKm: rounded(path.distanceKm, roundedToKm),
    bearingDeg: wholeBearing(path.bearingDeg),
    backBearingDeg: wholeBearing(path.backBearingDeg),
    longDistanceKm: rounded(path.longDistanceKm, roundedToKm),
    longBearingDeg: wholeBearing(path.longBearingDeg),
    roundedToKm,
  };
}

/** What is shared of an exact fix: its square of so many characters, or, when the owner says so, the point itself. */
export function placeFromFix(fix: Position, characters: ShareCharacters | 'exact'): Place {
  if (characters === 'exact') return { latDeg: fix.latDeg, lonDeg: fix.lonDeg };
  return { locator: locatorOf(fix, characters) };
}

/** Half the diagonal of a six-character square on the equator, rounded down: 2.5 by 5 minutes of arc. */
const SIX_CHARACTERS_ACCURACY_M = 5000;

/**
 * Four characters for a home, where people live close together, or where the fix is no better than the larger
 * square; else six. What is offered, not what is forced.
 */
export function defaultShareCharacters(site: {
  home: boolean;
  environment: Site['environment'];
  accuracyM?: number;
}): 4 | 6 {
  const amongHouses = site.environment === 'city' || site.environment === 'residential';
  const isCoarse = (site.accuracyM ?? 0) > SIX_CHARACTERS_ACCURACY_M;
  return site.home || amongHouses || isCoarse ? 4 : 6;
}

function rounded(value: number, step: number): number {
  return Math.round(value / step) * step;
}

function wholeBearing(bearingDeg: number): number {
  return Math.round(bearingDeg) % 360;
}
