import type { ChannelLookup } from '@harkmoor/sync-model/evidence/channel-lookup';
import { readFrequency } from '@harkmoor/sync-model/radio/bands/frequency-text';
import type { Reception } from '@harkmoor/sync-model/records/reception';
import { operatorOf, stationOf, type LogNames } from './log-names';
import type { LogRow } from './log-row';
import { folded, hasWord, searchWords } from './search-text';

export type StateChoice = 'only-here' | 'sent' | 'needs-attention';

/** What of the log is shown. Null and empty narrow nothing. */
export type LogFilter = {
  readonly search: string;
  /** "49 m broadcast"; `none` for outside every band. */
  readonly band: string | null;
  readonly outcome: Reception['outcome'] | null;
  readonly station: string | null;
  readonly antennaId: string | null;
  readonly siteId: string | null;
  /** An account's id, or `own`. */
  readonly operatorId: string | null;
  /** UTC dates, "2026-11-12", both included. */
  readonly fromDate: string | null;
  readonly toDate: string | null;
  readonly state: StateChoice | null;
  /** True for one's own entries in the bin instead of the log. */
  readonly bin: boolean;
};

export const WHOLE_LOG: LogFilter = {
  search: '',
  band: null,
  outcome: null,
  station: null,
  antennaId: null,
  siteId: null,
  operatorId: null,
  fromDate: null,
  toDate: null,
  state: null,
  bin: false,
};

export const OWN = 'own';
export const NO_BAND = 'none';
/** How long the bin keeps what lies in it. */
export const BIN_MS = 30 * 86_400_000;
/** A typed frequency finds what was tuned within half a kHz of it: dials are rarely exact. */
const NEAR_HZ = 500;
const DAY_MS = 86_400_000;

export type RowTest = (row: LogRow) => boolean;
export type FilterContext = {
  readonly names: LogNames;
  readonly channels: ChannelLookup;
  readonly nowMs: number;
};

/** The test that a row has to pass; made once for all rows, so that names are looked at once each. */
export function rowTest(filter: LogFilter, context: FilterContext): RowTest {
  const tests: RowTest[] = [
    filter.bin ? binTest(context) : (row) => row.binnedAt === null,
    ...placeTests(filter, context),
    ...timeTests(filter),
  ];
  if (filter.outcome) tests.push((row) => row.outcome === filter.outcome);
  if (filter.state) tests.push((row) => STATE_OWED[filter.state!] === row.owed);
  const search = searchTest(filter.search, context.names);
  if (search) tests.push(search);
  return (row) => tests.every((test) => test(row));
}

const STATE_OWED = { 'only-here': 'waiting', sent: 'none', 'needs-attention': 'refused' } as const;

function binTest({ names, nowMs }: FilterContext): RowTest {
  return ({ binnedAt, ownerId }) =>
    binnedAt !== null && binnedAt > nowMs - BIN_MS && operatorOf(ownerId, names) === null;
}

function placeTests(filter: LogFilter, { names, channels }: FilterContext): RowTest[] {
  const { band, station, antennaId, siteId, operatorId } = filter;
  const tests: RowTest[] = [];
  if (band) tests.push((row) => (channels(row.dialHz, row.targetHz).bandKey ?? NO_BAND) === band);
  if (station) tests.push((row) => stationOf(row, names) === station);
  if (antennaId) tests.push((row) => names.antennas.get(row.setupId)?.antennaId === antennaId);
  if (siteId) tests.push((row) => row.siteId === siteId);
  if (operatorId === OWN) tests.push((row) => operatorOf(row.ownerId, names) === null);
  else if (operatorId) tests.push((row) => row.ownerId === operatorId);
  return tests;
}

function timeTests({ fromDate, toDate }: LogFilter): RowTest[] {
  const tests: RowTest[] = [];
  if (fromDate) {
    const fromMs = Date.parse(fromDate);
    tests.push((row) => row.deviceAt >= fromMs);
  }
  if (toDate) {
    const beforeMs = Date.parse(toDate) + DAY_MS;
    tests.push((row) => row.deviceAt < beforeMs);
  }
  return tests;
}

/** Each word must begin a word of the name or of the remarks, or the whole be the frequency. */
function searchTest(search: string, names: LogNames): RowTest | null {
  const words = searchWords(search);
  if (words.length === 0) return null;
  const wantedHz = searchedFrequencies(search);
  const foldedNames = new Map<string, readonly boolean[]>();
  const wordsOfName = (row: LogRow): readonly boolean[] => {
    const name = stationOf(row, names);
    let found = foldedNames.get(name);
    if (!found) {
      const text = folded(name);
      foldedNames.set(name, (found = words.map((word) => hasWord(text, word))));
    }
    return found;
  };
  return (row) => {
    if (wantedHz.some((hz) => Math.abs(row.dialHz - hz) < NEAR_HZ)) return true;
    const inName = wordsOfName(row);
    return words.every((word, index) => inName[index] || (row.remarks !== '' && hasWord(row.remarks, word)));
  };
}

function searchedFrequencies(search: string): number[] {
  const reading = readFrequency(search);
  if (reading.kind === 'metre-band') return [];
  const found = reading.kind === 'frequency' ? [reading.frequencyHz] : [];
  return reading.alternativeHz === null ? found : [...found, reading.alternativeHz];
}

/** How many of the choices of the sheet narrow what is shown; the search is not one of them. */
export function narrowingCount(filter: LogFilter): number {
  const { search: _search, bin: _bin, ...choices } = filter;
  return Object.values(choices).filter((choice) => choice !== null).length;
}
