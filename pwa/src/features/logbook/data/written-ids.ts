import { RangeSet, type ObservabilitySet } from 'dexie';
import type { RecordType } from '@harkmoor/sync-model/records/record-types';

/** More written at once than this, and reading all again costs less than asking for each. */
const IDS_MAX = 2000;

/** What a write, here or in another tab, touched of one table: single records, all of it, or nothing. */
export type Written = { kind: 'nothing' } | { kind: 'ids'; ids: readonly string[] } | { kind: 'all' };

/** Reads from the database's own account of a write which records of a club and type it touched. */
export function writtenOf(
  parts: ObservabilitySet,
  at: { databaseName: string; clubId: string; type: RecordType },
): Written {
  const table = `idb://${at.databaseName}/${at.type}/`;
  const ids = new Set<string>();
  for (const name of [table, `${table}:dels`]) {
    const ranges = parts[name];
    // what comes from another tab has lost its prototype on the way
    for (const { from, to } of ranges ? new RangeSet().add(ranges) : []) {
      const id = singleId(from, to, at.clubId);
      if (id === null) return { kind: 'all' };
      if (id !== undefined) ids.add(id);
      if (ids.size > IDS_MAX) return { kind: 'all' };
    }
  }
  return ids.size === 0 ? { kind: 'nothing' } : { kind: 'ids', ids: [...ids] };
}

/** The id of a range of one key; undefined for a key of another club, null for a range of many. */
function singleId(from: unknown, to: unknown, clubId: string): string | null | undefined {
  if (!Array.isArray(from) || !Array.isArray(to) || from[0] !== to[0] || from[1] !== to[1]) return null;
  if (typeof from[1] !== 'string') return null;
  return from[0] === clubId ? from[1] : undefined;
}
