import { Entity, Property } from '@mikro-orm/core';
import type { Outing as Fields } from '@harkmoor/sync-model/records/outing';
import { composite, instant, optional, text, uuid, uuidList } from '../../sync/column-types.js';
import { RecordRow } from './record.row.js';

/** One field session of one operator. */
@Entity({ tableName: 'outing' })
export class OutingRow extends RecordRow implements Fields {
  @Property(uuid())
  siteId!: Fields['siteId'];

  @Property(instant())
  startedAt!: Fields['startedAt'];

  @Property(optional(composite()))
  ended!: Fields['ended'];

  @Property(optional(uuid()))
  targetListId!: Fields['targetListId'];

  @Property(uuidList())
  setupIds!: Fields['setupIds'];

  @Property(uuid())
  currentSetupId!: Fields['currentSetupId'];

  @Property(optional(uuid()))
  eventId!: Fields['eventId'];

  @Property(composite())
  clockSteps!: Fields['clockSteps'];

  @Property(optional(text(4000)))
  notes!: Fields['notes'];
}
