import { Entity, Property } from '@mikro-orm/core';
import type { Antenna as Fields } from '@harkmoor/sync-model/records/antenna';
import { flag, instant, number, optional, text, uuid, word } from '../../sync/column-types.js';
import { RecordRow } from './record.row.js';

/** An antenna with its measures. */
@Entity({ tableName: 'antenna' })
export class AntennaRow extends RecordRow implements Fields {
  @Property(text(60))
  name!: Fields['name'];

  @Property(word())
  kind!: Fields['kind'];

  @Property(optional(number()))
  lengthM!: Fields['lengthM'];

  @Property(optional(number()))
  heightM!: Fields['heightM'];

  @Property(optional(number()))
  azimuthDeg!: Fields['azimuthDeg'];

  @Property(optional(number()))
  gainDb!: Fields['gainDb'];

  @Property(flag())
  sharedUse!: Fields['sharedUse'];

  @Property(optional(uuid()))
  replaces!: Fields['replaces'];

  @Property(optional(text(4000)))
  notes!: Fields['notes'];

  @Property(optional(instant()))
  retiredAt!: Fields['retiredAt'];
}
