import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import { WholeNumberType } from '../platform/database/whole-number-type.js';

export type MailKind = 'confirm' | 'reset' | 'sign-up-known';

const PAUSE_MS_FIRST = 10_000;
const PAUSE_MS_MAX = 3_600_000;

/** A mail that waits to be sent; the row goes when the mail has gone. It holds no token, only the id that makes it. */
@Entity({ tableName: 'outgoing_mail' })
export class OutgoingMail {
  @PrimaryKey({ type: 'uuid' })
  readonly id: string;

  @Property({ type: 'text' })
  readonly kind: MailKind;

  @Property({ type: 'string', length: 254 })
  readonly toEmail: string;

  @Property({ type: 'string', length: 60 })
  readonly toName: string;

  @Property({ type: 'uuid' })
  readonly mailTokenId: string;

  @Property({ type: 'integer' })
  tries = 0;

  @Property({ type: WholeNumberType })
  nextTryAt: number;

  constructor(made: {
    id: string;
    kind: MailKind;
    toEmail: string;
    toName: string;
    mailTokenId: string;
    nowMs: number;
  }) {
    this.id = made.id;
    this.kind = made.kind;
    this.toEmail = made.toEmail;
    this.toName = made.toName;
    this.mailTokenId = made.mailTokenId;
    this.nextTryAt = made.nowMs;
  }

  /** Each failure doubles the pause, from 10 s to an hour. */
  failed(nowMs: number): void {
    this.tries += 1;
    this.nextTryAt = nowMs + Math.min(PAUSE_MS_MAX, PAUSE_MS_FIRST * 2 ** Math.min(this.tries - 1, 20));
  }
}
