import { Entity, PrimaryKey, PrimaryKeyProp, Property } from '@mikro-orm/core';
import type { WritableType } from '@harkmoor/sync-model/records/record-types';
import { composite, flag, instant, optional, text, uuid, wholeNumber, word } from './column-types.js';

/** One replaced value of one field of a record. Rows with a `seq` travel in the club's feed. */
@Entity({ tableName: 'history' })
export class HistoryRow {
  [PrimaryKeyProp]?: ['clubId', 'id'];

  @PrimaryKey(uuid())
  clubId!: string;

  @PrimaryKey(uuid())
  id!: string;

  @Property(optional(wholeNumber()))
  seq!: number | null;

  @Property(word())
  recordType!: WritableType;

  @Property(uuid())
  recordId!: string;

  @Property(text(40))
  field!: string;

  @Property(composite())
  replacedValue!: unknown;

  @Property(word())
  replacedStamp!: string;

  @Property(composite())
  keptValue!: unknown;

  @Property(word())
  keptStamp!: string;

  /** The account whose round met the stored value. */
  @Property(uuid())
  byId!: string;

  /** The writer had not seen the value that it met. */
  @Property(flag())
  clash!: boolean;

  @Property(instant())
  at!: number;
}
