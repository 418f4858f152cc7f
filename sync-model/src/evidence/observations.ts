import { entriesOf, type Entry } from './entries.js';
import type { EvidenceInput } from './evidence-input.js';

/** The unit of evidence: the first try in its hour. Both streams share the objects. */
export type Observation = Entry & { readonly antennaId: string; readonly counts: 'try' };

/**
 * The same tries counted twice over, for two questions; never add one to the other.
 * `channels` answers "can this frequency be heard": any signal on it counts, whatever target was listened for.
 * `targets` answers "can this station be heard": tries of a target, sure identities alone.
 * `entries` are all receptions with what became of them.
 */
export type Observations = {
  readonly entries: readonly Entry[];
  readonly channels: readonly Observation[];
  readonly targets: readonly Observation[];
};

/**
 * One observation per channel, and one per target, with site, antenna, UTC hour and UTC date: the first try by
 * corrected time, then id, whoever made it. The one function by which phone and server count. Rows come sorted
 * by time and id, whatever the order of the input.
 */
export function observationsOf(input: EvidenceInput): Observations {
  const entries = entriesOf(input);
  return { entries, ...firstTries(entries) };
}

/** As `observationsOf`, from entries that were derived before. */
export function firstTries(entries: readonly Entry[]): Pick<Observations, 'channels' | 'targets'> {
  const cells = cellNumbers();
  const channels = new Map<number, Observation>();
  const targets = new Map<number, Observation>();
  for (const entry of entries) {
    if (!isTry(entry)) continue;
    keepEarlier(channels, cells(entry.channelKey, entry), entry);
    if (entry.targetId !== null && entry.reason === null) {
      keepEarlier(targets, cells(entry.targetId, entry), entry);
    }
  }
  return { channels: inOrder(channels), targets: inOrder(targets) };
}

function isTry(entry: Entry): entry is Observation {
  return entry.counts === 'try' && entry.antennaId !== null;
}

function keepEarlier(first: Map<number, Observation>, cell: number, entry: Observation): void {
  const standing = first.get(cell);
  if (standing === undefined || byTimeThenId(entry, standing) < 0) first.set(cell, entry);
}

function inOrder(first: Map<number, Observation>): Observation[] {
  return [...first.values()].sort(byTimeThenId);
}

function byTimeThenId(a: Entry, b: Entry): number {
  return a.atMs - b.atMs || (a.receptionId < b.receptionId ? -1 : a.receptionId > b.receptionId ? 1 : 0);
}

/** Hours since 1970 lie within ±2²² for any instant and offset that records.md allows. */
const HOURS = 2 ** 23;

/**
 * Numbers the cells of the count: subject, site, antenna and hour. Numbers instead of joined text spare a phone
 * a string for each of 100 000 receptions.
 */
function cellNumbers(): (subject: string, entry: Observation) => number {
  const subjects = new Map<string, Map<string, Map<string, number>>>();
  let count = 0;
  return (subject, { siteId, antennaId, dayNumber, hourUtc }) => {
    const sites = within(subjects, subject);
    const antennas = within(sites, siteId);
    let place = antennas.get(antennaId);
    if (place === undefined) antennas.set(antennaId, (place = count++));
    return place * HOURS + (dayNumber * 24 + hourUtc) + HOURS / 2;
  };
}

function within<V>(maps: Map<string, Map<string, V>>, key: string): Map<string, V> {
  let inner = maps.get(key);
  if (inner === undefined) maps.set(key, (inner = new Map<string, V>()));
  return inner;
}
