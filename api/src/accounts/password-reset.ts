import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { MailQueue } from '../mail/mail-queue.js';
import { Clock } from '../platform/clock/clock.js';
import { inTransaction } from '../platform/database/in-transaction.js';
import { Refusal } from '../platform/errors/refusal.js';
import { Account } from './account.entity.js';
import { DeviceSession } from './device-session.entity.js';
import { MailAllowance } from './mail-allowance.js';
import { MailLinks } from './mail-links.js';
import { hashPassword } from './password.js';

/** A new password for somebody who reads the account's mail. */
@Injectable()
export class PasswordReset {
  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
    private readonly links: MailLinks,
    private readonly allowance: MailAllowance,
    private readonly queue: MailQueue,
  ) {}

  /** Sends a link to a known address; the caller learns nothing of whether it is known. */
  async request(email: string, network: string): Promise<Refusal | null> {
    const refusal = await this.allowance.ofNetwork(network);
    if (refusal) return refusal;
    const account = await this.em.findOne(Account, { email });
    if (account && !(await this.allowance.ofAddress(email))) {
      await inTransaction(this.em, (tx) => this.links.put(tx, account, 'reset'));
      this.queue.wake();
    }
    return null;
  }

  /** Sets the password, ends every session, and confirms the address, which the link has proved. */
  async reset(token: string, password: string): Promise<Refusal | null> {
    // before the transaction: hashing takes long, and the link's row is locked there
    const passwordHash = await hashPassword(password);
    return this.em.transactional(async (tx) => {
      const accountId = await this.links.spend(tx, token, 'reset');
      if (accountId instanceof Refusal) return accountId;
      const nowMs = this.clock.nowMs();
      const account = await tx.findOneOrFail(Account, { id: accountId });
      account.passwordHash = passwordHash;
      account.confirm(nowMs);
      const open = await tx.find(DeviceSession, { accountId, endedAt: null });
      for (const session of open) session.end('reset', nowMs);
      return null;
    });
  }
}
