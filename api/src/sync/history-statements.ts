import type { HistoryRow, ReplacedKey } from '@harkmoor/sync-model/hub/ports';
import { SERVER_DEVICE_ID } from '@harkmoor/sync-model/stamp/stamp';
import type { FeedSource } from './feed.js';
import type { Statement } from './sql-session.js';

/** Rows of one record that are kept; the oldest without a clash go first. */
const HISTORY_ROWS_PER_RECORD_MAX = 200;

/** `$1` club, `$2` a JSON list of rows. A row that stands already (the round was repeated) is left as it is. */
export const HISTORY_INSERT: Statement = {
  name: 'sync-history-insert',
  text: `insert into history (club_id, id, seq, record_type, record_id, field,
      replaced_value, replaced_stamp, kept_value, kept_stamp, by_id, clash, at)
    select $1, id, seq, record_type, record_id, field,
      coalesce(replaced_value, 'null'), replaced_stamp, coalesce(kept_value, 'null'), kept_stamp, by_id, clash, at
    from json_to_recordset($2::json) as r(id uuid, seq bigint, record_type text, record_id uuid, field text,
      replaced_value jsonb, replaced_stamp text, kept_value jsonb, kept_stamp text, by_id uuid, clash boolean, at bigint)
    on conflict (club_id, record_type, record_id, field, replaced_stamp, kept_stamp) do nothing`,
};

/** `$1` club, `$2` and `$3` types and ids of records, pairwise. Goes through the rows of these records alone. */
export const HISTORY_TRIM: Statement = {
  name: 'sync-history-trim',
  text: `delete from history using (
      select surplus.id from unnest($2::text[], $3::uuid[]) as record(type, id) cross join lateral (
        select history.id from history
        where club_id = $1 and record_type = record.type and record_id = record.id
        order by clash desc, at desc, history.id desc offset ${HISTORY_ROWS_PER_RECORD_MAX}
      ) surplus
    ) gone where history.club_id = $1 and history.id = gone.id`,
};

/** The values of `HISTORY_TRIM` beside the club: each record that the rows belong to, once. */
export function historyTrimValues(history: readonly HistoryRow[]): [string[], string[]] {
  const records = new Map(
    history.map(({ recordType, recordId }) => [`${recordType} ${recordId}`, recordType]),
  );
  return [[...records.values()], [...records.keys()].map((key) => key.slice(key.indexOf(' ') + 1))];
}

export function historyInsertValue(history: readonly HistoryRow[]): string {
  return JSON.stringify(
    history.map((row) => ({
      id: row.id,
      seq: row.seq,
      record_type: row.recordType,
      record_id: row.recordId,
      field: row.field,
      replaced_value: row.replaced.value,
      replaced_stamp: row.replaced.stamp,
      kept_value: row.kept.value,
      kept_stamp: row.kept.stamp,
      by_id: row.byId,
      clash: row.clash,
      at: row.at,
    })),
  );
}

/** `$1` club, `$2` a JSON list of values: gives those that a history row holds as replaced. */
export const HISTORY_REPLACED: Statement = {
  name: 'sync-history-replaced',
  text: `select type, id, field, stamp
    from json_to_recordset($2::json) as asked(type text, id uuid, field text, stamp text)
    where exists (select from history where club_id = $1 and record_type = asked.type and record_id = asked.id
      and history.field = asked.field and replaced_stamp = asked.stamp)`,
};

export function historyReplacedValue(values: readonly ReplacedKey[]): string {
  return JSON.stringify(values.map(({ type, id, field, stamp }) => ({ type, id, field, stamp })));
}

/** Rows with a `seq` travel; `feedRecordOfHistory` says the same of one row. */
export const HISTORY_FEED: FeedSource = {
  type: 'history',
  table: 'history',
  id: 'id',
  ownerId: 'null::uuid',
  stamp: `lpad(to_hex(at), 12, '0') || '0000${SERVER_DEVICE_ID}'`,
  stamps: 'null::jsonb',
  fields: `json_build_object('deleted', false, 'recordType', record_type, 'recordId', record_id, 'field', field,
    'replaced', json_build_object('value', replaced_value, 'stamp', replaced_stamp),
    'kept', json_build_object('value', kept_value, 'stamp', kept_stamp), 'byId', by_id, 'clash', clash)`,
};
