import type { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { v7 as newId } from 'uuid';
import { Clock } from '../platform/clock/clock.js';
import { MailSender } from './mail-sender.js';
import { OutgoingMail, type MailKind } from './outgoing-mail.entity.js';

type NewMail = {
  readonly kind: MailKind;
  readonly toEmail: string;
  readonly toName: string;
  readonly mailTokenId: string;
};

/** Mails are rows first: one that could not be sent yet, or whose server was stopped, goes later. */
@Injectable()
export class MailQueue {
  constructor(
    private readonly clock: Clock,
    private readonly sender: MailSender,
  ) {}

  /** Puts a mail into the caller's transaction; call `wake` after it. */
  put(tx: EntityManager, mail: NewMail): void {
    tx.persist(new OutgoingMail({ id: newId(), ...mail, nowMs: this.clock.nowMs() }));
  }

  /** Sends what is due soon, without the caller waiting for it. */
  wake(): void {
    this.sender.wake();
  }
}
