import { coarser, locatorOf } from '../radio/locator/locator.js';
import type { Site } from '../records/site.js';
import type { Observation } from './observations.js';

/** How fine the squares of a map are: fields, squares, subsquares of the Maidenhead locator. */
export type SquareCharacters = 2 | 4 | 6;

export type SquarePlace = {
  readonly locator: string;
  /** The place is shared more coarsely than the map asks for: a dashed outline of all of its square. */
  readonly coarseOnly: boolean;
};

export type SquareOfMap = SquarePlace & { readonly observations: readonly Observation[] };

type Placed = ReadonlyMap<string, Pick<Site, 'place'>>;

/** The square in which a site is drawn. A site shared at four characters is never placed finer. */
export function placeOfSite({ place }: Pick<Site, 'place'>, characters: SquareCharacters): SquarePlace {
  const shared = 'locator' in place ? place.locator : locatorOf(place, characters);
  return { locator: coarser(shared, characters), coarseOnly: shared.length < characters };
}

/** `placeOfSite` by the site's id, worked out once a site; undefined where the device does not hold it. */
export function sitePlaces(
  sites: Placed,
  characters: SquareCharacters,
): (siteId: string) => SquarePlace | undefined {
  const places = new Map<string, SquarePlace | undefined>();
  return (siteId) => {
    if (places.has(siteId)) return places.get(siteId);
    const site = sites.get(siteId);
    const place = site?.place ? placeOfSite(site, characters) : undefined;
    places.set(siteId, place);
    return place;
  };
}

/**
 * Observations by the square in which their site is drawn, sorted by locator, coarse ones first. Take `rateFor`,
 * `typicalScore` or the length of each for the fill. Observations of a site that is not held, or whose values are
 * gone, are in no square.
 */
export function squaresOf(
  observations: readonly Observation[],
  siteById: Placed,
  characters: SquareCharacters,
): SquareOfMap[] {
  const placeOf = sitePlaces(siteById, characters);
  const squares = new Map<string, SquarePlace & { observations: Observation[] }>();
  for (const observation of observations) {
    const place = placeOf(observation.siteId);
    if (!place) continue;
    const square = squares.get(place.locator);
    if (square) square.observations.push(observation);
    else squares.set(place.locator, { ...place, observations: [observation] });
  }
  return [...squares.values()].sort((a, b) => (a.locator < b.locator ? -1 : 1));
}
