import { Entity, Property } from '@mikro-orm/core';
import type { DialCheck as Fields } from '@harkmoor/sync-model/records/dial-check';
import { instant, number, optional, uuid, wholeNumber, word } from '../../sync/column-types.js';
import { RecordRow } from './record.row.js';

/** A dial against a carrier of known frequency. */
@Entity({ tableName: 'dial_check' })
export class DialCheckRow extends RecordRow implements Fields {
  @Property(uuid())
  receiverId!: Fields['receiverId'];

  @Property(instant())
  at!: Fields['at'];

  @Property(wholeNumber())
  referenceHz!: Fields['referenceHz'];

  @Property(wholeNumber())
  dialHz!: Fields['dialHz'];

  @Property(number())
  errorPpm!: Fields['errorPpm'];

  @Property(number())
  uncertaintyPpm!: Fields['uncertaintyPpm'];

  @Property(word())
  method!: Fields['method'];

  @Property(optional(number()))
  temperatureC!: Fields['temperatureC'];
}
