import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import { WholeNumberType } from '../platform/database/whole-number-type.js';

export type MailTokenPurpose = 'confirm' | 'reset';

const LIFE_MS: Readonly<Record<MailTokenPurpose, number>> = {
  confirm: 48 * 3_600_000,
  reset: 30 * 60_000,
};

/** A link that was sent by mail and works once. Its text is derived from the id by a key; only its hash is kept. */
@Entity({ tableName: 'mail_token' })
export class MailToken {
  @PrimaryKey({ type: 'uuid' })
  readonly id: string;

  @Property({ type: 'text' })
  readonly tokenHash: string;

  @Property({ type: 'uuid' })
  readonly accountId: string;

  @Property({ type: 'text' })
  readonly purpose: MailTokenPurpose;

  @Property({ type: WholeNumberType })
  readonly expiresAt: number;

  @Property({ type: WholeNumberType, nullable: true })
  usedAt: number | null = null;

  constructor(made: {
    id: string;
    tokenHash: string;
    accountId: string;
    purpose: MailTokenPurpose;
    nowMs: number;
  }) {
    this.id = made.id;
    this.tokenHash = made.tokenHash;
    this.accountId = made.accountId;
    this.purpose = made.purpose;
    this.expiresAt = made.nowMs + LIFE_MS[made.purpose];
  }

  /** Spends the link; false where it is spent, late, or made for something else. */
  spend(purpose: MailTokenPurpose, nowMs: number): boolean {
    if (this.purpose !== purpose || this.usedAt !== null || nowMs >= this.expiresAt) return false;
    this.usedAt = nowMs;
    return true;
  }
}
