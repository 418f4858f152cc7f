import type { EntityMetadata, MetadataStorage } from '@mikro-orm/core';
import { FIELD_NAMES } from '@harkmoor/sync-model/records/field-names';
import { WRITABLE_TYPES, type WritableType } from '@harkmoor/sync-model/records/record-types';
import type { RecordColumn, RecordTable } from '../sync/record-table.js';
import { RECORD_ROWS } from './record-rows.js';

/** Which column holds which field, read from the entities: the one place that says it. */
export function recordTables(metadata: MetadataStorage): RecordTable[] {
  return WRITABLE_TYPES.map((type) => recordTable(type, metadata.get(RECORD_ROWS[type].name)));
}

function recordTable(type: WritableType, { tableName, properties }: EntityMetadata): RecordTable {
  const columns = FIELD_NAMES[type].map((field): RecordColumn => {
    const property = (properties as Record<string, (typeof properties)[keyof typeof properties] | undefined>)[
      field
    ];
    const [column] = property?.fieldNames ?? [];
    const [columnType] = property?.columnTypes ?? [];
    if (!property || !column || !columnType) throw new Error(`${tableName} has no column for ${field}`);
    return { field, column, sqlType: withoutLength(columnType), nullable: property.nullable === true };
  });
  return { type, table: tableName, columns };
}

function withoutLength(columnType: string): string {
  return columnType.replace(/\(\d+\)$/, '');
}
