import { Entity, Property } from '@mikro-orm/core';
import type { TargetList as Fields } from '@harkmoor/sync-model/records/target-list';
import { instant, optional, text } from '../../sync/column-types.js';
import { RecordRow } from './record.row.js';

/** A list of targets; a draft until `publishedAt` is set. */
@Entity({ tableName: 'target_list' })
export class TargetListRow extends RecordRow implements Fields {
  @Property(text(60))
  name!: Fields['name'];

  @Property(optional(text(40)))
  edition!: Fields['edition'];

  @Property(optional(instant()))
  validFrom!: Fields['validFrom'];

  @Property(optional(instant()))
  validTo!: Fields['validTo'];

  @Property(optional(instant()))
  publishedAt!: Fields['publishedAt'];
}
