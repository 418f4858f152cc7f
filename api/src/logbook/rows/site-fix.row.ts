import { Entity, Property } from '@mikro-orm/core';
import type { SiteFix as Fields } from '@harkmoor/sync-model/records/site-fix';
import { composite, flag, number, optional } from '../../sync/column-types.js';
import { RecordRow } from './record.row.js';

/** The exact position of a site, in the My log of its owner, under the site's own id. */
@Entity({ tableName: 'site_fix' })
export class SiteFixRow extends RecordRow implements Fields {
  @Property(composite())
  fix!: Fields['fix'];

  @Property(optional(number()))
  elevationM!: Fields['elevationM'];

  @Property(flag())
  home!: Fields['home'];
}
