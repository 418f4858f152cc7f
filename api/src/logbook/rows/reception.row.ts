import { Entity, Property } from '@mikro-orm/core';
import type { Reception as Fields } from '@harkmoor/sync-model/records/reception';
import {
  composite,
  instant,
  number,
  optional,
  smallWholeNumber,
  text,
  uuid,
  wholeNumber,
  word,
  wordList,
} from '../../sync/column-types.js';
import { RecordRow } from './record.row.js';

const GENERATED = {
  dialHz: "((tuning->>'dialHz')::bigint) stored",
  mode: "(tuning->>'mode') stored",
};

/** One log record: heard, nil or skipped. */
@Entity({ tableName: 'reception' })
export class ReceptionRow extends RecordRow implements Fields {
  @Property(optional(uuid()))
  outingId!: Fields['outingId'];

  @Property(uuid())
  siteId!: Fields['siteId'];

  @Property(uuid())
  setupId!: Fields['setupId'];

  @Property(optional(uuid()))
  targetId!: Fields['targetId'];

  @Property(optional(wholeNumber()))
  targetHz!: Fields['targetHz'];

  @Property(optional(uuid()))
  eventId!: Fields['eventId'];

  @Property(optional(composite()))
  swap!: Fields['swap'];

  @Property(optional(smallWholeNumber()))
  roundNo!: Fields['roundNo'];

  @Property(word())
  outcome!: Fields['outcome'];

  @Property(word())
  basis!: Fields['basis'];

  @Property(word())
  identity!: Fields['identity'];

  @Property(optional(word()))
  nilReason!: Fields['nilReason'];

  @Property(instant())
  deviceAt!: Fields['deviceAt'];

  @Property(optional(number()))
  durationS!: Fields['durationS'];

  @Property(composite())
  tuning!: Fields['tuning'];

  @Property(optional(smallWholeNumber()))
  bandwidthHz!: Fields['bandwidthHz'];

  @Property(optional(number()))
  attenuationDb!: Fields['attenuationDb'];

  @Property(optional(composite()))
  sinpo!: Fields['sinpo'];

  @Property(optional(composite()))
  rst!: Fields['rst'];

  @Property(optional(composite()))
  meter!: Fields['meter'];

  @Property(optional(composite()))
  noiseMeter!: Fields['noiseMeter'];

  @Property(optional(wordList()))
  carried!: Fields['carried'];

  @Property(optional(composite()))
  programme!: Fields['programme'];

  @Property(optional(text(4000)))
  remarks!: Fields['remarks'];

  @Property(optional(text(80)))
  stationName!: Fields['stationName'];

  @Property(optional(text(60)))
  heardBy!: Fields['heardBy'];

  /** Read from `tuning` by the database, so that the server can filter on it; never sent. */
  @Property({ ...wholeNumber(), generated: GENERATED.dialHz, nullable: true })
  readonly dialHz?: number;

  @Property({ ...word(), generated: GENERATED.mode, nullable: true })
  readonly mode?: string;
}
