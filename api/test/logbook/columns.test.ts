import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import type { MikroORM } from '@mikro-orm/postgresql';
import { z } from 'zod';
import { WRITABLE_TYPES } from '@harkmoor/sync-model/records/record-types';
import { RECORD_SCHEMAS } from '@harkmoor/sync-model/records/schemas';
import { recordTables } from '../../src/logbook/record-tables.js';
import { testDatabase } from '../sync/test-database.js';

type JsonSchema = {
  type?: string;
  anyOf?: JsonSchema[];
  items?: JsonSchema;
  enum?: unknown[];
  pattern?: string;
  maxLength?: number;
  minimum?: number;
  maximum?: number;
};
type Column = { column_name: string; udt_name: string; is_nullable: string; length: number | null };

const RECORD_COLUMNS = ['club_id', 'id', 'owner_id', 'seq', 'stamp', 'stamps', 'received_at'];
const GENERATED: Readonly<Record<string, readonly string[]>> = { reception: ['dial_hz', 'mode'] };
const INT_MAX = 2 ** 31 - 1;

let orm: MikroORM;
beforeAll(async () => {
  orm = await testDatabase();
});
afterAll(async () => {
  await orm.schema.dropDatabase();
  await orm.close(true);
});

async function columnsOf(table: string): Promise<Map<string, Column>> {
  const rows = await orm.em.getConnection().execute<Column[]>(
    `select column_name, udt_name, is_nullable, character_maximum_length as length
     from information_schema.columns where table_schema = current_schema and table_name = ?`,
    [table],
  );
  return new Map(rows.map((row) => [row.column_name, row]));
}

/** The PostgreSQL type, as the catalogue spells it, that holds every value of a field's schema and no other kind. */
function fittingType(schema: JsonSchema): string {
  if (schema.type === 'string' && schema.pattern?.includes('-7[0-9a-f]{3}-')) return 'uuid';
  if (schema.type === 'string') return schema.maxLength === undefined ? 'text' : 'varchar';
  if (schema.type === 'boolean') return 'bool';
  if (schema.type === 'number') return 'float8';
  if (schema.type === 'integer') {
    return schema.maximum! > INT_MAX || schema.minimum! < -INT_MAX ? 'int8' : 'int4';
  }
  const item = schema.type === 'array' && schema.items ? fittingType(schema.items) : 'jsonb';
  return item === 'jsonb' ? 'jsonb' : `_${item}`;
}

function fieldSchema(field: z.ZodType): { schema: JsonSchema; nullable: boolean } {
  const whole = z.toJSONSchema(field, { unrepresentable: 'any' }) as JsonSchema;
  const nullable = whole.anyOf?.some(({ type }) => type === 'null') ?? false;
  const rest = whole.anyOf?.filter(({ type }) => type !== 'null') ?? [];
  return { schema: nullable && rest.length === 1 ? rest[0]! : whole, nullable };
}

/** A type of the mapper's in the words of PostgreSQL's catalogue. */
function asCatalogued(type: string): string {
  const [, name, length = '', list = ''] = /^([a-z ]+?)(\(\d+\))?(\[\])?$/.exec(type) ?? [];
  return `${CATALOGUE_NAMES[name ?? ''] ?? name}${length}${list}`;
}
const CATALOGUE_NAMES: Readonly<Record<string, string>> = {
  varchar: 'character varying',
  char: 'character',
  int: 'integer',
  timestamptz: 'timestamp with time zone',
};

describe('the tables of the logbook', () => {
  it.each(WRITABLE_TYPES)('should hold each field of a %s in a column of a fitting type', async (type) => {
    const table = recordTables(orm.getMetadata()).find((candidate) => candidate.type === type)!;
    const columns = await columnsOf(table.table);
    for (const [field, part] of Object.entries(RECORD_SCHEMAS[type].shape)) {
      const { schema, nullable } = fieldSchema(part as z.ZodType);
      const column = columns.get(table.columns.find((candidate) => candidate.field === field)!.column);
      expect({
        field,
        type: column?.udt_name,
        nullable: column?.is_nullable === 'YES',
        length: column?.length,
      }).toEqual({
        field,
        type: fittingType(schema),
        nullable,
        length: fittingType(schema) === 'varchar' ? schema.maxLength : null,
      });
    }
  });

  it.each(WRITABLE_TYPES)('should have no column of a %s without a field', async (type) => {
    const table = recordTables(orm.getMetadata()).find((candidate) => candidate.type === type)!;
    const expected = [
      ...RECORD_COLUMNS,
      ...table.columns.map(({ column }) => column),
      ...(GENERATED[type] ?? []),
    ];
    expect([...(await columnsOf(table.table)).keys()].sort()).toEqual(expected.sort());
  });

  it('should name to the mapper exactly the tables and columns that the database has, with their types', async () => {
    const named: string[] = [];
    for (const { tableName, props } of Object.values(orm.getMetadata().getAll())) {
      for (const { fieldNames, columnTypes, nullable } of tableName ? props : []) {
        const [name, type] = [fieldNames?.[0], asCatalogued(columnTypes?.[0] ?? '')];
        if (name) named.push(`${tableName}.${name} ${type}${nullable ? ' or null' : ''}`);
      }
    }
    const found = await orm.em.getConnection().execute<{ column: string }[]>(`
      select relname || '.' || attname || ' ' || format_type(atttypid, atttypmod)
        || case when attnotnull then '' else ' or null' end as column
      from pg_attribute join pg_class on pg_class.oid = attrelid
      where relnamespace = current_schema::regnamespace and relkind = 'r' and attnum > 0 and not attisdropped
        and relname <> 'mikro_orm_migrations'`);
    expect(named.sort()).toEqual(found.map(({ column }) => column).sort());
  });

  it('should begin every key and foreign key of club data with the club', async () => {
    const keys = await orm.em.getConnection().execute<
      { table: string; key: string; first: string; refers: string | null }[]
    >(`
      select conrelid::regclass::text as table, conname as key,
        (select attname from pg_attribute where attrelid = conrelid and attnum = conkey[1]) as first,
        (select attname from pg_attribute where attrelid = confrelid and attnum = confkey[1]) as refers
      from pg_constraint where contype in ('p', 'u', 'f') and conrelid in (
        select attrelid from pg_attribute where attname = 'club_id' and not attisdropped)`);
    const reference = keys.filter(
      ({ table, key }) => !(table === 'membership' && key === 'membership_account_id_fkey'),
    );
    expect(reference.length).toBeGreaterThan(35);
    for (const key of reference) {
      expect(key).toMatchObject({ first: 'club_id' });
      expect([null, 'club_id']).toContain(key.refers);
    }
  });
});
