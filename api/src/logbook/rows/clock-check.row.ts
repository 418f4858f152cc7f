import { Entity, Property } from '@mikro-orm/core';
import type { ClockCheck as Fields } from '@harkmoor/sync-model/records/clock-check';
import { instant, number, optional, smallWholeNumber, wholeNumber, word } from '../../sync/column-types.js';
import { RecordRow } from './record.row.js';

/** A device clock against a time signal. */
@Entity({ tableName: 'clock_check' })
export class ClockCheckRow extends RecordRow implements Fields {
  @Property(word())
  deviceId!: Fields['deviceId'];

  @Property(instant())
  deviceAt!: Fields['deviceAt'];

  @Property(wholeNumber())
  offsetMs!: Fields['offsetMs'];

  @Property(smallWholeNumber())
  uncertaintyMs!: Fields['uncertaintyMs'];

  @Property(word())
  method!: Fields['method'];

  @Property(optional(number()))
  pathKm!: Fields['pathKm'];
}
