import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import { ClubDirectory } from '../clubs/club-directory.js';
import { Clock } from '../platform/clock/clock.js';
import { ACCESS_LIFE_S } from './access-token.js';
import { Account } from './account.entity.js';
import type { WhoAmI } from './account-schemas.js';

/** What a signed-in device is told of itself: account, clubs, and a token for the next quarter of an hour. */
@Injectable()
export class WhoAmIAnswer {
  constructor(
    private readonly em: EntityManager,
    private readonly clock: Clock,
    private readonly jwt: JwtService,
    private readonly directory: ClubDirectory,
  ) {}

  async of(accountId: string): Promise<WhoAmI> {
    const account = await this.em.findOneOrFail(Account, { id: accountId });
    const { id, name, email, isConfirmed: confirmed } = account;
    return { account: { id, name, email, confirmed }, clubs: await this.directory.clubsOf(accountId) };
  }

  /** Signed with the module's options: algorithm, type, audience and issuer are fixed there. */
  accessToken(accountId: string, sessionId: string): string {
    const iat = Math.floor(this.clock.nowMs() / 1000);
    return this.jwt.sign({ sub: accountId, sid: sessionId, iat, exp: iat + ACCESS_LIFE_S });
  }
}
