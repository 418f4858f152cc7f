import { LockMode } from '@mikro-orm/core';
import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { v7 as newId } from 'uuid';
import { Clock } from '../platform/clock/clock.js';
import { Configuration } from '../platform/configuration/configuration.js';
import { Refusal } from '../platform/errors/refusal.js';
import { randomToken, Secrets, tokenHash } from '../platform/secrets/secrets.js';
import { Account } from './account.entity.js';
import { Attempts } from '../platform/attempts/attempts.js';
import { DeviceSession } from './device-session.entity.js';
import { hashPassword, needsRehash, passwordFits } from './password.js';
import { RefreshToken } from './refresh-token.entity.js';

type Credentials = {
  readonly email: string;
  readonly password: string;
  readonly deviceId: string;
  readonly deviceName: string;
};

/** A session and the refresh token that its device holds from now on. */
export type OpenSession = {
  readonly accountId: string;
  readonly sessionId: string;
  readonly refreshToken: string;
};

const FIRST_WAIT_MS = 60_000;
const WAIT_MS_MAX = 15 * 60_000;

/** Sign-in, rotation of refresh tokens, sign-out. */
@Injectable()
export class Sessions {
  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
    private readonly secrets: Secrets,
    private readonly attempts: Attempts,
    private readonly configuration: Configuration,
  ) {}

  /** Unknown addresses and wrong passwords get one refusal, after the same work. */
  async signIn(
    { email, password, deviceId, deviceName }: Credentials,
    network: string,
  ): Promise<OpenSession | Refusal> {
    const subject = ['sign-in', email, network];
    const refusal = await this.attempts.take(subject, {
      kind: 'growing',
      free: this.configuration.signInTries,
      firstWaitMs: FIRST_WAIT_MS,
      waitMsMax: WAIT_MS_MAX,
    });
    if (refusal) return refusal;
    const account = await this.em.findOne(Account, { email });
    const fits = await passwordFits(account?.passwordHash, password);
    if (!account || !fits)
      return new Refusal('wrong-credentials', 'The address or the password is not right.');
    await this.attempts.clear(subject);
    if (needsRehash(account.passwordHash)) {
      await this.em.nativeUpdate(Account, { id: account.id }, { passwordHash: await hashPassword(password) });
    }
    return this.open(account.id, deviceId, deviceName);
  }

  /** A device that signs in again leaves its earlier session behind. */
  private open(accountId: string, deviceId: string, deviceName: string): Promise<OpenSession> {
    const refreshToken = randomToken();
    const firstHash = tokenHash(refreshToken);
    const sessionId = newId();
    const nowMs = this.clock.nowMs();
    return this.em.transactional(async (tx) => {
      const earlier = await tx.find(DeviceSession, { accountId, deviceId, endedAt: null });
      for (const session of earlier) session.end('signed-in-again', nowMs);
      tx.persist(new DeviceSession({ id: sessionId, accountId, deviceId, deviceName, firstHash, nowMs }));
      tx.persist(new RefreshToken(firstHash, sessionId, nowMs));
      return { accountId, sessionId, refreshToken };
    });
  }

  /**
   * Gives the successor of a refresh token. It is derived from the token by a key, so a device whose answer was
   * lost gets the same one again until it first uses it; after that the old token ends the session.
   */
  refresh(refreshToken: string): Promise<OpenSession | Refusal> {
    const successor = this.secrets.mac('refresh-successor', refreshToken);
    return this.em.transactional(async (tx) => {
      const session = await this.lockedSession(tx, refreshToken);
      const nowMs = this.clock.nowMs();
      if (!session?.isOpen(nowMs)) return signInAgain();
      const successorHash = tokenHash(successor);
      if (session.rotate(tokenHash(refreshToken), successorHash, nowMs) === 'reuse') return signInAgain();
      await tx.upsert(RefreshToken, new RefreshToken(successorHash, session.id, nowMs), {
        onConflictAction: 'ignore',
      });
      return { accountId: session.accountId, sessionId: session.id, refreshToken: successor };
    });
  }

  /** Ends the session that gave out this token, whether it is the newest or not. */
  signOut(refreshToken: string): Promise<void> {
    return this.em.transactional(async (tx) => {
      const session = await this.lockedSession(tx, refreshToken);
      session?.end('signed-out', this.clock.nowMs());
    });
  }

  private async lockedSession(tx: EntityManager, refreshToken: string): Promise<DeviceSession | null> {
    const known = await tx.findOne(RefreshToken, { tokenHash: tokenHash(refreshToken) });
    if (!known) return null;
    const lockMode = LockMode.PESSIMISTIC_WRITE;
    return tx.findOne(DeviceSession, { id: known.sessionId }, { lockMode, refresh: true });
  }
}

function signInAgain(): Refusal {
  return new Refusal(
    'unauthenticated',
    'This device is not signed in any more. Sign in again; nothing is lost.',
  );
}
