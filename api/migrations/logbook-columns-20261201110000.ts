/** Pieces of column definitions that the tables of this migration share. */

export const FREQUENCY = 'between 1000 and 3000000000';
export const INSTANT = 'between 631152000000 and 4102444800000';
export const MODES = "in ('AM', 'SAM', 'USB', 'LSB', 'DSB', 'CW', 'FM', 'digital', 'other')";
export const OBJECT = (column: string) => `jsonb not null check (jsonb_typeof(${column}) = 'object')`;
export const OBJECT_OR_NULL = (column: string) => `jsonb check (jsonb_typeof(${column}) = 'object')`;
export const LIST = (column: string) => `jsonb not null check (jsonb_typeof(${column}) = 'array')`;
export const INSTANT_OR_NULL = (column: string) => `${column} bigint check (${column} ${INSTANT})`;
export const INSTANT_NOT_NULL = (column: string) => `${column} bigint not null check (${column} ${INSTANT})`;
export const FREQUENCY_NOT_NULL = (column: string) =>
  `${column} bigint not null check (${column} ${FREQUENCY})`;
/** Within a number column's limits; null passes. */
export const RANGED = (column: string, type: string, low: number, high: number) =>
  `${column} ${type} check (${column} between ${low} and ${high})`;
export const NOT_NULL_RANGED = (column: string, type: string, low: number, high: number) =>
  `${column} ${type} not null check (${column} between ${low} and ${high})`;
export const PARENT = (column: string, table: string) =>
  `foreign key (club_id, ${column}) references ${table} (club_id, id)`;
export const CLUB = 'foreign key (club_id) references club';
export const STAMP = (column: string) =>
  `${column} text collate "C" not null check (${column} ~ '^[0-9a-f]{16}[0-9a-z]{8}$')`;
