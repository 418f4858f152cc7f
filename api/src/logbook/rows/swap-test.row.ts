import { Entity, Property } from '@mikro-orm/core';
import type { SwapTest as Fields } from '@harkmoor/sync-model/records/swap-test';
import {
  composite,
  optional,
  smallWholeNumber,
  uuid,
  uuidList,
  wholeNumber,
  word,
} from '../../sync/column-types.js';
import { RecordRow } from './record.row.js';

/** A guided paired comparison of antennas. */
@Entity({ tableName: 'swap_test' })
export class SwapTestRow extends RecordRow implements Fields {
  @Property(uuid())
  outingId!: Fields['outingId'];

  @Property(uuidList())
  setupIds!: Fields['setupIds'];

  @Property(optional(uuid()))
  targetId!: Fields['targetId'];

  @Property(optional(wholeNumber()))
  frequencyHz!: Fields['frequencyHz'];

  @Property(word())
  measure!: Fields['measure'];

  @Property(smallWholeNumber())
  pairsPlanned!: Fields['pairsPlanned'];

  @Property(smallWholeNumber())
  gapLimitS!: Fields['gapLimitS'];

  @Property(smallWholeNumber())
  dwellS!: Fields['dwellS'];

  @Property(wholeNumber())
  seed!: Fields['seed'];

  @Property(optional(composite()))
  ended!: Fields['ended'];
}
