import { PARENT_FIELDS, type WritableType } from '@harkmoor/sync-model/records/record-types';
import { columnOf, fieldsJson, quoted, type RecordTable } from './record-table.js';
import type { Statement } from './sql-session.js';

/** Columns of every record beside its fields, in the order of the upsert. */
const OWN_COLUMNS = [
  ['id', 'uuid'],
  ['owner_id', 'uuid'],
  ['seq', 'bigint'],
  ['stamp', 'text'],
  ['stamps', 'jsonb'],
] as const;

/** `$1` club, then a list of ids for each table in their order: all that a transaction reads, in one question. */
export function readStatement(tables: readonly RecordTable[]): Statement {
  const reads = tables.map(
    (
      table,
      index,
    ) => `select '${table.type}' as type, id, owner_id, seq, stamp, stamps, ${fieldsJson(table)} as fields
      from ${quoted(table.table)} where club_id = $1 and id = any($${index + 2}::uuid[])`,
  );
  return { name: 'sync-read', text: reads.join(' union all ') };
}

/** `$1` club, `$2` a JSON list of rows keyed by column: all rows of one type in one statement. */
export function upsertStatement(table: RecordTable): Statement {
  const columns = [...OWN_COLUMNS.map(([column, sqlType]) => ({ column, sqlType })), ...table.columns];
  const names = columns.map(({ column }) => quoted(column));
  const updates = names.slice(1).map((name) => `${name} = excluded.${name}`);
  return {
    name: `sync-upsert-${table.type}`,
    text: `insert into ${quoted(table.table)} (club_id, ${names.join(', ')})
      select $1, ${names.map((name) => `r.${name}`).join(', ')}
      from json_to_recordset($2::json) as r(${columns
        .map(({ column, sqlType }) => `${quoted(column)} ${sqlType}`)
        .join(', ')})
      on conflict (club_id, id) do update set ${updates.join(', ')}`,
  };
}

/** `$1` club, `$2` ids of records of `type`: gives those that any record of the club names in a parent field. */
export function referredStatement(tables: readonly RecordTable[], type: WritableType): Statement | null {
  const tests = tables.flatMap((table) =>
    PARENT_FIELDS[table.type]
      .filter((parent) => parent.type === type)
      .map(({ field, many }) => {
        const column = `child.${quoted(columnOf(table, field).column)}`;
        const names = many ? `${column} @> array[asked.id]` : `${column} = asked.id`;
        return `exists (select from ${quoted(table.table)} child where child.club_id = $1 and ${names})`;
      }),
  );
  if (tests.length === 0) return null;
  return {
    name: `sync-referred-${type}`,
    text: `select asked.id from unnest($2::uuid[]) as asked(id) where ${tests.join(' or ')}`,
  };
}
