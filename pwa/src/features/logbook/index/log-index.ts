import type { LogNames } from './log-names';
import type { LogRow } from './log-row';
import type { RowTest } from './log-filter';

/** One outing, or one day without an outing, with the rows of it that are shown. */
export type LogGroup = {
  readonly key: string;
  /** UTC ms by which groups are ordered and named: the start of the outing. */
  readonly atMs: number;
  readonly outingId: string | null;
  readonly siteId: string;
  readonly ownerId: string | null;
  readonly rows: readonly LogRow[];
};

type Bucket = { rows: LogRow[]; isSorted: boolean };

const DAY_MS = 86_400_000;

/**
 * Rows by outing. Putting a row costs the same however many there are; order is made when it is asked for, and
 * only where something changed.
 */
export class LogIndex {
  private readonly byId = new Map<string, LogRow>();
  private readonly buckets = new Map<string, Bucket>();

  get size(): number {
    return this.byId.size;
  }

  put(row: LogRow): void {
    this.remove(row.id);
    this.byId.set(row.id, row);
    const key = bucketKey(row);
    const bucket = this.buckets.get(key);
    if (bucket) {
      bucket.rows.push(row);
      bucket.isSorted = false;
    } else this.buckets.set(key, { rows: [row], isSorted: true });
  }

  remove(id: string): void {
    const row = this.byId.get(id);
    if (!row) return;
    this.byId.delete(id);
    const key = bucketKey(row);
    const bucket = this.buckets.get(key)!;
    bucket.rows = bucket.rows.filter((other) => other !== row);
    if (bucket.rows.length === 0) this.buckets.delete(key);
  }

  rows(): Iterable<LogRow> {
    return this.byId.values();
  }

  /** The groups that hold a row which passes, newest outing first, and in each the newest row first. */
  groups(passes: RowTest, names: LogNames): LogGroup[] {
    const groups: LogGroup[] = [];
    for (const [key, bucket] of this.buckets) {
      if (!bucket.isSorted) sortNewestFirst(bucket);
      const rows = bucket.rows.filter(passes);
      const first = rows[0];
      if (first) groups.push(groupOf(key, first, rows, names));
    }
    return groups.sort((a, b) => b.atMs - a.atMs || (a.key < b.key ? -1 : 1));
  }
}

function groupOf(key: string, first: LogRow, rows: readonly LogRow[], names: LogNames): LogGroup {
  const outing = first.outingId === null ? undefined : names.outings.get(first.outingId);
  return {
    key,
    atMs: outing?.startedAt ?? Math.floor(first.deviceAt / DAY_MS) * DAY_MS,
    outingId: first.outingId,
    siteId: outing?.siteId ?? first.siteId,
    ownerId: first.ownerId,
    rows,
  };
}

/** An entry without an outing stands with those of the same person, place and UTC date. */
function bucketKey({ outingId, ownerId, siteId, deviceAt }: LogRow): string {
  return outingId ?? `${Math.floor(deviceAt / DAY_MS)}/${ownerId ?? ''}/${siteId}`;
}

function sortNewestFirst(bucket: Bucket): void {
  bucket.rows.sort((a, b) => b.deviceAt - a.deviceAt || (a.id < b.id ? 1 : -1));
  bucket.isSorted = true;
}
