import type { Query } from '../../../platform/paths';
import { WHOLE_LOG, type LogFilter, type StateChoice } from '../index/log-filter';

const OUTCOMES = ['heard', 'nil', 'skipped'] as const;
const STATES: readonly StateChoice[] = ['only-here', 'sent', 'needs-attention'];
const DATE = /^\d{4}-\d{2}-\d{2}$/;

/** Reads an address's query; what it does not understand is as if it were not there. */
export function readFilter(search: string): LogFilter {
  const query = new URLSearchParams(search);
  return {
    search: query.get('q') ?? '',
    band: query.get('band') || null,
    outcome: OUTCOMES.find((each) => each === query.get('outcome')) ?? null,
    station: query.get('station') || null,
    antennaId: query.get('antenna') || null,
    siteId: query.get('site') || null,
    operatorId: query.get('operator') || null,
    fromDate: readDate(query.get('from')),
    toDate: readDate(query.get('to')),
    state: STATES.find((each) => each === query.get('state')) ?? null,
    bin: query.get('bin') === '1',
  };
}

/** The query of an address that `readFilter` reads back; what narrows nothing is left out. */
export function filterQuery(filter: LogFilter): Query {
  return {
    q: filter.search || null,
    band: filter.band,
    outcome: filter.outcome,
    station: filter.station,
    antenna: filter.antennaId,
    site: filter.siteId,
    operator: filter.operatorId,
    from: filter.fromDate,
    to: filter.toDate,
    state: filter.state,
    bin: filter.bin ? '1' : null,
  };
}

/** The reception that stands open beside the list on a laptop. */
export function readOpenId(search: string): string | null {
  return new URLSearchParams(search).get('open') || null;
}

/** The same view with nothing that narrows it. */
export function widened(filter: LogFilter): LogFilter {
  return { ...WHOLE_LOG, bin: filter.bin };
}

/** A calendar date, or null: "2026-02-31" is none. */
export function readDate(text: string | null): string | null {
  if (text === null || !DATE.test(text)) return null;
  const atMs = Date.parse(text);
  return !Number.isNaN(atMs) && new Date(atMs).toISOString().startsWith(text) ? text : null;
}
