import { Entity, Property } from '@mikro-orm/core';
import type { Target as Fields } from '@harkmoor/sync-model/records/target';
import { composite, number, optional, text, uuid, wholeNumber, word } from '../../sync/column-types.js';
import { RecordRow } from './record.row.js';

/** A transmission worth listening for. */
@Entity({ tableName: 'target' })
export class TargetRow extends RecordRow implements Fields {
  @Property(uuid())
  listId!: Fields['listId'];

  @Property(text(80))
  name!: Fields['name'];

  @Property(wholeNumber())
  frequencyHz!: Fields['frequencyHz'];

  @Property(word())
  mode!: Fields['mode'];

  @Property(composite())
  schedule!: Fields['schedule'];

  @Property(composite())
  silences!: Fields['silences'];

  @Property(optional(composite()))
  tx!: Fields['tx'];

  @Property(optional(number()))
  powerKw!: Fields['powerKw'];

  @Property(optional(text(40)))
  language!: Fields['language'];

  @Property(optional(text(4000)))
  note!: Fields['note'];
}
