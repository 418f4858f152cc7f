import { Entity, Property } from '@mikro-orm/core';
import type { Receiver as Fields } from '@harkmoor/sync-model/records/receiver';
import {
  composite,
  flag,
  instant,
  number,
  optional,
  smallWholeNumber,
  smallWholeNumberList,
  text,
  uuid,
  wholeNumberList,
} from '../../sync/column-types.js';
import { RecordRow } from './record.row.js';

/** A receiver with what its dial, meter and supply are known to do. */
@Entity({ tableName: 'receiver' })
export class ReceiverRow extends RecordRow implements Fields {
  @Property(text(60))
  name!: Fields['name'];

  @Property(composite())
  ranges!: Fields['ranges'];

  @Property(composite())
  meterScale!: Fields['meterScale'];

  @Property(optional(wholeNumberList()))
  ifHz!: Fields['ifHz'];

  @Property(optional(smallWholeNumberList()))
  bandwidthsHz!: Fields['bandwidthsHz'];

  @Property(optional(number()))
  supplyMa!: Fields['supplyMa'];

  @Property(optional(number()))
  batteryMah!: Fields['batteryMah'];

  @Property(optional(smallWholeNumber()))
  dialStepHz!: Fields['dialStepHz'];

  @Property(flag())
  sharedUse!: Fields['sharedUse'];

  @Property(optional(uuid()))
  replaces!: Fields['replaces'];

  @Property(optional(text(4000)))
  notes!: Fields['notes'];

  @Property(optional(instant()))
  retiredAt!: Fields['retiredAt'];
}
