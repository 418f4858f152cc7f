import { Entity, Property } from '@mikro-orm/core';
import type { Setup as Fields } from '@harkmoor/sync-model/records/setup';
import { instant, number, optional, text, uuid } from '../../sync/column-types.js';
import { RecordRow } from './record.row.js';

/** A receiver with an antenna, and what stands between them. */
@Entity({ tableName: 'setup' })
export class SetupRow extends RecordRow implements Fields {
  @Property(uuid())
  receiverId!: Fields['receiverId'];

  @Property(uuid())
  antennaId!: Fields['antennaId'];

  @Property(optional(text(60)))
  coupling!: Fields['coupling'];

  @Property(number())
  attenuationDb!: Fields['attenuationDb'];

  @Property(number())
  preampDb!: Fields['preampDb'];

  @Property(optional(instant()))
  retiredAt!: Fields['retiredAt'];
}
