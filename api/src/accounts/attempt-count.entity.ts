import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import { WholeNumberType } from '../platform/database/whole-number-type.js';

/** How often something was tried of late; the key is a hash, so that the table names nobody. */
@Entity({ tableName: 'attempt_count' })
export class AttemptCount {
  @PrimaryKey({ type: 'string' })
  readonly keyHash!: string;

  @Property({ type: 'integer' })
  tries!: number;

  @Property({ type: WholeNumberType })
  lastAt!: number;
}
