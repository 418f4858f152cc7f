import { UniqueConstraintViolationException } from '@mikro-orm/core';
import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { v7 as newId } from 'uuid';
import { MyLog } from '../clubs/my-log.js';
import { MailQueue } from '../mail/mail-queue.js';
import { Clock } from '../platform/clock/clock.js';
import { inTransaction } from '../platform/database/in-transaction.js';
import { Refusal } from '../platform/errors/refusal.js';
import { Account } from './account.entity.js';
import { MailAllowance } from './mail-allowance.js';
import { MailLinks } from './mail-links.js';
import { hashPassword } from './password.js';

type SignUpRequest = { readonly name: string; readonly email: string; readonly password: string };

/** Makes accounts, and confirms that an address is its person's. */
@Injectable()
export class SignUp {
  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
    private readonly myLog: MyLog,
    private readonly links: MailLinks,
    private readonly allowance: MailAllowance,
    private readonly queue: MailQueue,
  ) {}

  /**
   * A new address gets an account with My log and a mail to confirm it; a known one gets a mail that says so.
   * Both do the same work up to the first write, and the caller learns nothing of which it was.
   */
  async signUp({ name, email, password }: SignUpRequest, network: string): Promise<Refusal | null> {
    const refusal = await this.allowance.ofNetwork(network);
    if (refusal) return refusal;
    const passwordHash = await hashPassword(password);
    const known = (await this.em.findOne(Account, { email })) ?? (await this.make(name, email, passwordHash));
    if (known) await this.mail(known, 'sign-up-known');
    this.queue.wake();
    return null;
  }

  /** Asks for the confirming mail once more; nothing happens where the address is confirmed. */
  async confirmAgain(accountId: string, network: string): Promise<Refusal | null> {
    const refusal = await this.allowance.ofNetwork(network);
    if (refusal) return refusal;
    const account = await this.em.findOneOrFail(Account, { id: accountId });
    if (!account.isConfirmed) await this.mail(account, 'confirm');
    this.queue.wake();
    return null;
  }

  /** Null where the link was good and the address is confirmed. */
  confirm(token: string): Promise<Refusal | null> {
    return this.em.transactional(async (tx) => {
      const accountId = await this.links.spend(tx, token, 'confirm');
      if (accountId instanceof Refusal) return accountId;
      const account = await tx.findOneOrFail(Account, { id: accountId });
      account.confirm(this.clock.nowMs());
      return null;
    });
  }

  /** Null where the account was made; the account that was there first where two sign-ups crossed. */
  private async make(name: string, email: string, passwordHash: string): Promise<Account | null> {
    const createdAt = this.clock.nowMs();
    const account = new Account({ id: newId(), email, name, passwordHash, createdAt });
    try {
      await inTransaction(this.em.fork(), (tx) => {
        tx.persist(account);
        this.myLog.make(tx, account);
        this.links.put(tx, account, 'confirm');
      });
      return null;
    } catch (error) {
      if (error instanceof UniqueConstraintViolationException) {
        return this.em.findOneOrFail(Account, { email });
      }
      throw error;
    }
  }

  /** An address that got many mails this hour gets no more, and nobody is told. */
  private async mail(account: Account, kind: 'sign-up-known' | 'confirm'): Promise<void> {
    if (await this.allowance.ofAddress(account.email)) return;
    await inTransaction(this.em, (tx) => this.links.put(tx, account, kind));
  }
}
