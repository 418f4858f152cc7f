import { Entity, Property } from '@mikro-orm/core';
import type { Site as Fields } from '@harkmoor/sync-model/records/site';
import { composite, flag, instant, optional, text, word } from '../../sync/column-types.js';
import { RecordRow } from './record.row.js';

/** A named place as the club knows it; the exact fix is a row of `site_fix` in the owner's My log. */
@Entity({ tableName: 'site' })
export class SiteRow extends RecordRow implements Fields {
  @Property(text(60))
  name!: Fields['name'];

  @Property(composite())
  place!: Fields['place'];

  @Property(word())
  environment!: Fields['environment'];

  @Property(flag())
  sharedUse!: Fields['sharedUse'];

  @Property(optional(text(4000)))
  notes!: Fields['notes'];

  @Property(optional(instant()))
  retiredAt!: Fields['retiredAt'];
}
