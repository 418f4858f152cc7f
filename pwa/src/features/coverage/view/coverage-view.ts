import { normaliseLocator } from '@harkmoor/sync-model/radio/locator/locator';
import type { Query } from '../../../platform/paths';
import { ANTENNA_KIND_WORDS, type AntennaKindName } from './antenna-kinds';
import { ALL_HOURS, rangeCode, readRangeCode, type HourRange } from './hour-range';
import { isMonthKey } from './months';

export type Measure = 'rate' | 'score' | 'count';
/** What the figures are about. Nothing chosen means the channel with the most observations. */
export type Subject =
  | { readonly kind: 'most-tried' }
  | { readonly kind: 'any' }
  | { readonly kind: 'channel' | 'band'; readonly key: string };
export type AntennaChoice =
  | { readonly kind: 'any' }
  | { readonly kind: 'kind'; readonly antennaKind: AntennaKindName }
  | { readonly kind: 'one'; readonly antennaId: string };

/** What the map, a square and the table show. All of it stands in the address, so that a reload and a link keep it. */
export type CoverageView = {
  readonly subject: Subject;
  readonly measure: Measure;
  readonly hours: HourRange;
  /** Empty for all months. */
  readonly monthKeys: readonly string[];
  readonly antenna: AntennaChoice;
  readonly setupId: string | null;
  readonly operatorId: string | null;
  /** The locator of the chosen square. */
  readonly square: string | null;
};

export const WIDEST_VIEW: CoverageView = {
  subject: { kind: 'most-tried' },
  measure: 'rate',
  hours: ALL_HOURS,
  monthKeys: [],
  antenna: { kind: 'any' },
  setupId: null,
  operatorId: null,
  square: null,
};

const MEASURES: readonly Measure[] = ['rate', 'score', 'count'];

/** Reads an address's query; what it does not understand is as if it were not there. */
export function readView(search: string): CoverageView {
  const query = new URLSearchParams(search);
  const measure = MEASURES.find((each) => each === query.get('shows'));
  const months = (query.get('months') ?? '').split(',').filter(isMonthKey);
  return {
    subject: readSubject(query),
    measure: measure ?? 'rate',
    hours: readRangeCode(query.get('hours')),
    monthKeys: [...new Set(months)].sort(),
    antenna: readAntenna(query),
    setupId: query.get('setup') || null,
    operatorId: query.get('operator') || null,
    square: normaliseLocator(query.get('square') ?? '') ?? null,
  };
}

/** The query of an address that `readView` reads back; what narrows nothing is left out. */
export function viewQuery(view: CoverageView): Query {
  const { subject, antenna } = view;
  return {
    channel: subject.kind === 'channel' ? subject.key : subject.kind === 'any' ? 'any' : null,
    band: subject.kind === 'band' ? subject.key : null,
    shows: view.measure === 'rate' ? null : view.measure,
    hours: view.hours.lengthH >= 24 ? null : rangeCode(view.hours),
    months: view.monthKeys.length === 0 ? null : view.monthKeys.join(','),
    antenna: antenna.kind === 'one' ? antenna.antennaId : null,
    'antenna-kind': antenna.kind === 'kind' ? antenna.antennaKind : null,
    setup: view.setupId,
    operator: view.operatorId,
    square: view.square,
  };
}

/** How many of the choices narrow what is shown, those of the second row only. */
export function narrowingCount(view: CoverageView): number {
  return [view.monthKeys.length > 0, view.setupId !== null, view.operatorId !== null].filter(Boolean).length;
}

/** The same view with nothing that narrows but the frequency: what is offered where nothing matches. */
export function widened(view: CoverageView): CoverageView {
  return { ...WIDEST_VIEW, subject: view.subject, measure: view.measure };
}

function readSubject(query: URLSearchParams): Subject {
  const channel = query.get('channel');
  if (channel === 'any') return { kind: 'any' };
  if (channel) return { kind: 'channel', key: channel };
  const band = query.get('band');
  return band ? { kind: 'band', key: band } : { kind: 'most-tried' };
}

function readAntenna(query: URLSearchParams): AntennaChoice {
  const antennaId = query.get('antenna');
  if (antennaId) return { kind: 'one', antennaId };
  const kind = query.get('antenna-kind');
  return kind !== null && Object.hasOwn(ANTENNA_KIND_WORDS, kind)
    ? { kind: 'kind', antennaKind: kind as AntennaKindName }
    : { kind: 'any' };
}
