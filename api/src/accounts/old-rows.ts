import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable, Logger, type BeforeApplicationShutdown, type OnModuleInit } from '@nestjs/common';
import { AttemptCount, REMEMBERED_MS } from '../platform/attempts/attempt-count.entity.js';
import { Clock } from '../platform/clock/clock.js';
import { DeviceSession, SESSION_IDLE_MS_MAX } from './device-session.entity.js';
import { MailToken } from './mail-token.entity.js';
import { RefreshToken } from './refresh-token.entity.js';

const HOUR_MS = 3_600_000;
/** A spent refresh token is known as spent for so long; an older one is refused like an invented one. */
const SPENT_KNOWN_MS = 90 * 24 * HOUR_MS;

/** Takes away what nothing asks for any more: old counts, links, tokens and sessions. */
@Injectable()
export class OldRows implements OnModuleInit, BeforeApplicationShutdown {
  private readonly log = new Logger(OldRows.name);
  private timer: NodeJS.Timeout | undefined;

  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
  ) {}

  onModuleInit(): void {
    this.timer = setInterval(() => {
      this.remove().catch((error: unknown) => {
        this.log.error(
          `old rows could not be removed: ${error instanceof Error ? error.name : typeof error}`,
        );
      });
    }, HOUR_MS);
    this.timer.unref();
  }

  beforeApplicationShutdown(): void {
    clearInterval(this.timer);
  }

  /** A mail that could not be sent goes with its link; a session's tokens go with the session. */
  async remove(): Promise<void> {
    const em = this.em.fork();
    const nowMs = this.clock.nowMs();
    await em.nativeDelete(AttemptCount, { lastAt: { $lt: nowMs - 2 * REMEMBERED_MS } });
    await em.nativeDelete(MailToken, { expiresAt: { $lt: nowMs - HOUR_MS } });
    await em.nativeDelete(DeviceSession, { lastSeenAt: { $lt: nowMs - SESSION_IDLE_MS_MAX } });
    // the pending and the newest used token of an open session stay, however old they are
    await em.nativeDelete(RefreshToken, {
      issuedAt: { $lt: nowMs - SPENT_KNOWN_MS },
      $not: { tokenHash: { $in: await this.hashesInUse(em) } },
    });
  }

  private async hashesInUse(em: EntityManager): Promise<string[]> {
    const open = await em.find(
      DeviceSession,
      { endedAt: null, lastSeenAt: { $lt: this.clock.nowMs() - SPENT_KNOWN_MS } },
      { fields: ['currentHash', 'pendingHash'] },
    );
    return open.flatMap(({ currentHash, pendingHash }) => [currentHash ?? pendingHash, pendingHash]);
  }
}
