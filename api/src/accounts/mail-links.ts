import { LockMode } from '@mikro-orm/core';
import type { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { v7 as newId } from 'uuid';
import { MailQueue } from '../mail/mail-queue.js';
import type { MailKind } from '../mail/outgoing-mail.entity.js';
import { Clock } from '../platform/clock/clock.js';
import { Refusal } from '../platform/errors/refusal.js';
import { Secrets, tokenHash } from '../platform/secrets/secrets.js';
import type { Account } from './account.entity.js';
import { MailToken, type MailTokenPurpose } from './mail-token.entity.js';

const PURPOSE: Readonly<Record<MailKind, MailTokenPurpose>> = {
  confirm: 'confirm',
  reset: 'reset',
  'sign-up-known': 'reset',
};

/** Links that are sent by mail: made with the mail in one transaction, spent once. */
@Injectable()
export class MailLinks {
  constructor(
    private readonly clock: Clock,
    private readonly secrets: Secrets,
    private readonly queue: MailQueue,
  ) {}

  /** Puts a mail with a new link into the caller's transaction. */
  put(tx: EntityManager, account: Account, kind: MailKind): void {
    const id = newId();
    const nowMs = this.clock.nowMs();
    const hash = tokenHash(this.secrets.mac('mail-token', id));
    tx.persist(new MailToken({ id, tokenHash: hash, accountId: account.id, purpose: PURPOSE[kind], nowMs }));
    this.queue.put(tx, { kind, toEmail: account.email, toName: account.name, mailTokenId: id });
  }

  /** Spends a link under a lock, so that two clicks cannot both win; the account's id, or why not. */
  async spend(tx: EntityManager, token: string, purpose: MailTokenPurpose): Promise<string | Refusal> {
    const lockMode = LockMode.PESSIMISTIC_WRITE;
    const link = await tx.findOne(MailToken, { tokenHash: tokenHash(token) }, { lockMode });
    if (link?.spend(purpose, this.clock.nowMs())) return link.accountId;
    return new Refusal('link-spent', 'This link was used already or is too old. Ask for a new one.');
  }
}
