import type { RecordType } from '@harkmoor/sync-model/records/record-types';
import { fieldsJson, quoted, type RecordTable } from './record-table.js';
import type { Statement } from './sql-session.js';

/**
 * Rows that travel in a club's feed. `table` has `club_id` and `seq` with an index on both; the rest are SQL
 * expressions over one row of it. `fields` gives json, empty fields left out.
 */
export type FeedSource = {
  readonly type: RecordType;
  readonly table: string;
  readonly id: string;
  readonly ownerId: string;
  readonly stamp: string;
  readonly stamps: string;
  readonly fields: string;
};

export function recordFeed(table: RecordTable): FeedSource {
  return {
    type: table.type,
    table: table.table,
    id: 'id',
    ownerId: 'owner_id',
    stamp: 'stamp',
    stamps: 'stamps',
    // no composite value of a record holds a null of its own, so this takes off empty fields alone
    fields: `json_strip_nulls(${fieldsJson(table)})`,
  };
}

/**
 * `$1` club, `$2` cursor, `$3` limit: the next rows of the feed over all sources. The first step finds the last
 * `seq` of the page from the indexes alone, so that only rows of the page are turned into json.
 */
export function pageStatement(sources: readonly FeedSource[]): Statement {
  const positions = sources.map(
    ({ table }) => `(select seq from ${quoted(table)} where club_id = $1 and seq > $2 order by seq limit $3)`,
  );
  const rows = sources.map(
    (source) => `select '${source.type}' as type, ${source.id} as id, ${source.ownerId} as owner_id, seq,
      ${source.stamp} as stamp, ${source.stamps} as stamps, ${source.fields} as fields
      from ${quoted(source.table)}
      where club_id = $1 and seq > $2 and seq <= (select last from page)`,
  );
  return {
    name: 'sync-page',
    text: `with page as materialized (
        select max(seq) as last from (
          select seq from (${positions.join(' union all ')}) positions order by seq limit $3
        ) first
      )
      ${rows.join(' union all ')} order by seq`,
  };
}
