import { ArrayType, type PropertyOptions } from '@mikro-orm/core';
import { WholeNumberType } from '../platform/database/whole-number-type.js';

/**
 * The column types of records, one for each kind of field in the schemas. Units are in the fields' names.
 * Instants and whole numbers above 2³¹ are bigint, read as numbers: every value that a schema lets through is
 * a safe integer, and it comes back as the same digits (docs/decisions/0101-instants-as-bigint.md). Each call
 * gives a new object, since the mapper completes the one it is given.
 */
type Column = PropertyOptions<object>;

/** A field that may be empty. */
export const optional = (column: Column): Column => ({ ...column, nullable: true });

export const uuid = (): Column => ({ type: 'uuid' });
export const flag = (): Column => ({ type: 'boolean' });
export const word = (): Column => ({ type: 'text' });
export const number = (): Column => ({ type: 'double' });
export const smallWholeNumber = (): Column => ({ type: 'integer' });
export const wholeNumber = (): Column => ({ type: WholeNumberType });
/** Milliseconds UTC. */
export const instant = wholeNumber;
/** Values that mean something only together: one field under one stamp. */
export const composite = (): Column => ({ type: 'json' });

export const uuidList = (): Column => ({ type: ArrayType, columnType: 'uuid[]' });
export const wordList = (): Column => ({ type: ArrayType, columnType: 'text[]' });
export const smallWholeNumberList = (): Column => ({ type: new ArrayType(Number), columnType: 'int[]' });
export const wholeNumberList = (): Column => ({ type: new ArrayType(Number), columnType: 'bigint[]' });

/** Text of at most so many characters. The schemas count UTF-16 units, so this never refuses what they accept. */
export function text(lengthMax: number): Column {
  return { type: 'string', length: lengthMax };
}
