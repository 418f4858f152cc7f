import type { Site } from '../records/site.js';
import type { Entry } from './entries.js';
import { bandRate, heardRate, type HeardRate } from './heard-rate.js';
import type { Observation, Observations } from './observations.js';
import { sitePlaces, type SquareCharacters } from './squares.js';

/** What a map, a square or a table asks for. What is absent does not narrow; an empty list matches nothing. */
export type EvidenceFilter = {
  readonly channelKey?: string;
  readonly bandKey?: string;
  /** Asks for one station: takes the stream of targets instead of that of channels. */
  readonly targetId?: string;
  readonly hoursUtc?: readonly number[];
  /** UTC months, "2026-11". */
  readonly monthKeys?: readonly string[];
  readonly siteIds?: readonly string[];
  readonly antennaIds?: readonly string[];
  readonly setupIds?: readonly string[];
  /** Those who made the try that counts. */
  readonly ownerIds?: readonly (string | null)[];
  /** A square as it is drawn at so many characters. */
  readonly square?: { readonly locator: string; readonly characters: SquareCharacters };
};

type Placed = ReadonlyMap<string, Pick<Site, 'place'>>;

/** The observations that a filter asks for: of one target where it names one, else of channels. */
export function filterObservations(
  observations: Pick<Observations, 'channels' | 'targets'>,
  filter: EvidenceFilter,
  sites: Placed,
): Observation[] {
  const stream = filter.targetId === undefined ? observations.channels : observations.targets;
  return stream.filter(entryMatcher(filter, sites));
}

/** Whether an entry lies within the filter; the sets are made once. */
export function entryMatcher(filter: EvidenceFilter, sites: Placed): (entry: Entry) => boolean {
  const { channelKey, bandKey, targetId, square } = filter;
  const hours = setOf(filter.hoursUtc);
  const months = setOf(filter.monthKeys);
  const siteIds = setOf(filter.siteIds);
  const antennaIds = setOf<string | null>(filter.antennaIds);
  const setupIds = setOf(filter.setupIds);
  const ownerIds = setOf(filter.ownerIds);
  const placeOf = square && sitePlaces(sites, square.characters);
  return (entry) =>
    (channelKey === undefined || entry.channelKey === channelKey) &&
    (bandKey === undefined || entry.bandKey === bandKey) &&
    (targetId === undefined || entry.targetId === targetId) &&
    (!hours || hours.has(entry.hourUtc)) &&
    (!months || months.has(entry.monthKey)) &&
    (!siteIds || siteIds.has(entry.siteId)) &&
    (!antennaIds || antennaIds.has(entry.antennaId)) &&
    (!setupIds || setupIds.has(entry.setupId)) &&
    (!ownerIds || ownerIds.has(entry.ownerId)) &&
    (!placeOf || placeOf(entry.siteId)?.locator === square?.locator);
}

/**
 * The rate that answers a filter: of its channel or target as it is; of a band, or of everything, as the mean of
 * the channels. A band that is logged as a whole is its own channel.
 */
export function rateFor(observations: readonly Observation[], filter: EvidenceFilter): HeardRate {
  if (filter.channelKey !== undefined || filter.targetId !== undefined) return heardRate(observations);
  if (filter.bandKey !== undefined && observations.every(({ isWholeBand }) => isWholeBand)) {
    return heardRate(observations);
  }
  return bandRate(observations);
}

function setOf<T>(values: readonly T[] | undefined): ReadonlySet<T> | undefined {
  return values && new Set(values);
}
