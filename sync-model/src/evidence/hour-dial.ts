import { rateFor } from './filter.js';
import type { HeardRate } from './heard-rate.js';
import type { Observation } from './observations.js';

export type DialRings = 'bands' | 'channels';

export type DialCell = { readonly hourUtc: number } & HeardRate;

export type DialRing = {
  /** Band or channel. */
  readonly key: string;
  /** Observations of the whole ring. */
  readonly n: number;
  /** One for each UTC hour, 0 to 23. */
  readonly cells: readonly DialCell[];
};

/**
 * The hour dial: for each band or channel its heard rate in each of the 24 UTC hours. A ring stands where
 * anything was tried; signals outside every band stand in no ring of bands. In the order of the lowest frequency
 * met in each ring, for rings from the middle outwards.
 */
export function hourDial(observations: readonly Observation[], rings: DialRings): DialRing[] {
  const byRing = new Map<string, { lowestHz: number; hours: Observation[][]; n: number }>();
  for (const observation of observations) {
    const key = rings === 'bands' ? observation.bandKey : observation.channelKey;
    if (key === null) continue;
    let ring = byRing.get(key);
    if (!ring) byRing.set(key, (ring = { lowestHz: Infinity, hours: emptyHours(), n: 0 }));
    ring.hours[observation.hourUtc]!.push(observation);
    ring.n++;
    if (observation.frequencyHz < ring.lowestHz) ring.lowestHz = observation.frequencyHz;
  }
  return [...byRing.entries()]
    .sort(([a, one], [b, other]) => one.lowestHz - other.lowestHz || (a < b ? -1 : 1))
    .map(([key, { hours, n }]) => ({
      key,
      n,
      cells: hours.map((inHour, hourUtc) => ({
        hourUtc,
        ...rateFor(inHour, rings === 'bands' ? { bandKey: key } : { channelKey: key }),
      })),
    }));
}

function emptyHours(): Observation[][] {
  return Array.from({ length: 24 }, () => []);
}
