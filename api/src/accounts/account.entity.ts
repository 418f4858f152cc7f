import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import { WholeNumberType } from '../platform/database/whole-number-type.js';

/** A person who may sign in. The address is kept trimmed and in lower case. */
@Entity({ tableName: 'account' })
export class Account {
  @PrimaryKey({ type: 'uuid' })
  readonly id: string;

  @Property({ type: 'string', length: 254 })
  readonly email: string;

  @Property({ type: 'string', length: 60 })
  readonly name: string;

  /** A PHC string of argon2id. */
  @Property({ type: 'text' })
  passwordHash: string;

  @Property({ type: WholeNumberType })
  readonly createdAt: number;

  @Property({ type: WholeNumberType, nullable: true })
  confirmedAt: number | null = null;

  constructor(made: { id: string; email: string; name: string; passwordHash: string; createdAt: number }) {
    this.id = made.id;
    this.email = made.email;
    this.name = made.name;
    this.passwordHash = made.passwordHash;
    this.createdAt = made.createdAt;
  }

  /** Confirmation limits founding and inviting; signing in and logging never ask for it. */
  get isConfirmed(): boolean {
    return this.confirmedAt !== null;
  }

  /** The address has proved to be this person's; the first proof counts. */
  confirm(nowMs: number): void {
    this.confirmedAt ??= nowMs;
  }
}
