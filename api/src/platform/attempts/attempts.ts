import { LockMode } from '@mikro-orm/core';
import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { Clock } from '../clock/clock.js';
import { Refusal } from '../errors/refusal.js';
import { Secrets } from '../secrets/secrets.js';
import { AttemptCount, type AttemptRule } from './attempt-count.entity.js';

/** Counts tries in the database, so that several servers share one count and parallel tries cannot slip past it. */
@Injectable()
export class Attempts {
  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
    private readonly secrets: Secrets,
  ) {}

  /** Null where the try is free; else a refusal that says how long to wait. */
  async take(subject: readonly string[], rule: AttemptRule): Promise<Refusal | null> {
    const keyHash = this.keyHash(subject);
    const nowMs = this.clock.nowMs();
    const waitMs = await this.em.fork().transactional(async (tx) => {
      await tx
        .createQueryBuilder(AttemptCount)
        .insert({ keyHash, tries: 0, firstAt: nowMs, lastAt: nowMs })
        .onConflict('key_hash')
        .ignore();
      const count = await tx.findOneOrFail(
        AttemptCount,
        { keyHash },
        { lockMode: LockMode.PESSIMISTIC_WRITE },
      );
      // read under the lock: of parallel tries, none counts from a moment before the one that it waits for
      return count.take(rule, this.clock.nowMs());
    });
    return waitMs > 0 ? waitRefusal(waitMs) : null;
  }

  /** A success wipes the slate. */
  async clear(subject: readonly string[]): Promise<void> {
    await this.em.nativeDelete(AttemptCount, { keyHash: this.keyHash(subject) });
  }

  private keyHash(subject: readonly string[]): string {
    return this.secrets.mac('attempt-key', JSON.stringify(subject));
  }
}

function waitRefusal(waitMs: number): Refusal {
  const seconds = Math.ceil(waitMs / 1000);
  const wait = seconds < 90 ? `${seconds} seconds` : `${Math.ceil(seconds / 60)} minutes`;
  return new Refusal('too-many', `Too many tries. Wait ${wait} and try again.`, undefined, seconds);
}
