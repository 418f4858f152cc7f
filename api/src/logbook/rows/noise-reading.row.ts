import { Entity, Property } from '@mikro-orm/core';
import type { NoiseReading as Fields } from '@harkmoor/sync-model/records/noise-reading';
import { composite, instant, smallWholeNumber, uuid, wholeNumber } from '../../sync/column-types.js';
import { RecordRow } from './record.row.js';

/** The noise at a site with a setup, without a signal. */
@Entity({ tableName: 'noise_reading' })
export class NoiseReadingRow extends RecordRow implements Fields {
  @Property(uuid())
  siteId!: Fields['siteId'];

  @Property(uuid())
  setupId!: Fields['setupId'];

  @Property(instant())
  at!: Fields['at'];

  @Property(wholeNumber())
  dialHz!: Fields['dialHz'];

  @Property(smallWholeNumber())
  bandwidthHz!: Fields['bandwidthHz'];

  @Property(composite())
  meter!: Fields['meter'];
}
