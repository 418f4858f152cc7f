import { operatorOf, stationOf, type LogNames } from './log-names';
import type { LogGroup } from './log-index';
import type { LogRow } from './log-row';

/** A group as the screen heads it. */
export type GroupHead = {
  readonly key: string;
  /** UTC ms of the outing's start. */
  readonly atMs: number;
  readonly siteName: string;
  readonly hasOuting: boolean;
  /** Whose it is; null for one's own. */
  readonly operator: string | null;
  readonly count: number;
  /** How many rows stand before it, heads not counted. */
  readonly start: number;
};

/** A row as the screen shows it. */
export type ShownRow = Pick<
  LogRow,
  'id' | 'dialHz' | 'deviceAt' | 'outcome' | 'nilReason' | 'sinpo' | 'rst' | 'carried' | 'owed' | 'binnedAt'
> & {
  readonly station: string;
  readonly antenna: string;
  readonly operator: string | null;
  readonly isClash: boolean;
};

export function groupHeads(groups: readonly LogGroup[], names: LogNames): GroupHead[] {
  let start = 0;
  return groups.map((group) => {
    const head = {
      key: group.key,
      atMs: group.atMs,
      siteName: names.sites.get(group.siteId) ?? 'Unknown site',
      hasOuting: group.outingId !== null,
      operator: operatorOf(group.ownerId, names),
      count: group.rows.length,
      start,
    };
    start += head.count;
    return head;
  });
}

export function shownRow(row: LogRow, names: LogNames): ShownRow {
  const { id, dialHz, deviceAt, outcome, nilReason, sinpo, rst, carried, owed, binnedAt } = row;
  return {
    ...{ id, dialHz, deviceAt, outcome, nilReason, sinpo, rst, carried, owed, binnedAt },
    station: stationOf(row, names),
    antenna: names.antennas.get(row.setupId)?.name ?? 'Unknown antenna',
    operator: operatorOf(row.ownerId, names),
    isClash: names.clashes.has(id),
  };
}

/** A line of the list: the head of a group, or a row by its place among all rows. */
export type ListLine =
  { readonly kind: 'head'; readonly head: GroupHead } | { readonly kind: 'row'; readonly place: number };

export function lineCount(heads: readonly GroupHead[]): number {
  const last = heads.at(-1);
  return last ? last.start + last.count + heads.length : 0;
}

/** What stands on a line. Each head takes one line before its rows. */
export function lineAt(heads: readonly GroupHead[], line: number): ListLine {
  let low = 0;
  let high = heads.length - 1;
  while (low < high) {
    const middle = (low + high + 1) >>> 1;
    if (heads[middle]!.start + middle <= line) low = middle;
    else high = middle - 1;
  }
  const head = heads[low];
  if (!head) throw new Error(`no line ${line} in an empty list`);
  return line === head.start + low ? { kind: 'head', head } : { kind: 'row', place: line - low - 1 };
}

/** The line on which a row stands; the reverse of `lineAt`. */
export function lineOfPlace(heads: readonly GroupHead[], place: number): number {
  let low = 0;
  let high = heads.length - 1;
  while (low < high) {
    const middle = (low + high + 1) >>> 1;
    if (heads[middle]!.start <= place) low = middle;
    else high = middle - 1;
  }
  return place + low + 1;
}
