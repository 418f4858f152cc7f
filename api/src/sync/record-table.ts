import type { WritableType } from '@harkmoor/sync-model/records/record-types';

/** A field of a record and the column that holds it; `sqlType` as PostgreSQL spells it, without a length. */
export type RecordColumn = {
  readonly field: string;
  readonly column: string;
  readonly sqlType: string;
  readonly nullable: boolean;
};

/** The table of one record type. Its columns beside those of every record are exactly the type's fields. */
export type RecordTable = {
  readonly type: WritableType;
  readonly table: string;
  readonly columns: readonly RecordColumn[];
};

export function columnOf(table: RecordTable, field: string): RecordColumn {
  const column = table.columns.find((candidate) => candidate.field === field);
  if (!column) throw new Error(`${table.table} has no column for the field ${field}`);
  return column;
}

export function quoted(identifier: string): string {
  return `"${identifier.replaceAll('"', '""')}"`;
}

/** json of all fields of a row, nulls included. */
export function fieldsJson(table: RecordTable): string {
  const pairs = table.columns.map(
    ({ field, column }) => `'${field}', ${quoted(table.table)}.${quoted(column)}`,
  );
  return `json_build_object(${pairs.join(', ')})`;
}
