import { PrimaryKey, PrimaryKeyProp, Property } from '@mikro-orm/core';
import { composite, flag, optional, uuid, wholeNumber, word } from '../../sync/column-types.js';

/** What every record of a club carries. `clubId` begins every key, so that a club can live on any node. */
export abstract class RecordRow {
  [PrimaryKeyProp]?: ['clubId', 'id'];

  @PrimaryKey(uuid())
  clubId!: string;

  @PrimaryKey(uuid())
  id!: string;

  /** The account that made the record; set by the server and never changed. */
  @Property(uuid())
  ownerId!: string;

  /** Position in the club's feed: dense under the club's lock, unique in the club. */
  @Property(wholeNumber())
  seq!: number;

  /** The stamp of every field that `stamps` does not name. */
  @Property(word())
  stamp!: string;

  /** Fields whose stamp differs; null where none does. */
  @Property(optional(composite()))
  stamps!: Record<string, string> | null;

  /** When the server first took the record. */
  @Property({ type: 'timestamptz' })
  receivedAt!: Date;

  @Property(flag())
  deleted!: boolean;

  @Property(optional(uuid()))
  importId!: string | null;
}
