import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import { ExtractJwt, Strategy } from 'passport-jwt';
import type { SignedInAs } from '../platform/access/signed-in.js';
import { Clock } from '../platform/clock/clock.js';
import { Secrets } from '../platform/secrets/secrets.js';
import { ACCESS_ALGORITHM, ACCESS_AUDIENCE, ACCESS_ISSUER, verifiedTokenSchema } from './access-token.js';
import { Account } from './account.entity.js';
import { DeviceSession } from './device-session.entity.js';

/**
 * Accepts an access token that this server signed, that is in time, and whose session is still open: the end of
 * a session holds at the next request.
 */
@Injectable()
export class AccessTokenStrategy extends PassportStrategy(Strategy) {
  constructor(
    secrets: Secrets,
    private readonly em: EntityManager,
    private readonly clock: Clock,
  ) {
    super({
      jwtFromRequest: ExtractJwt.fromAuthHeaderAsBearerToken(),
      secretOrKey: secrets.key('access-token'),
      algorithms: [ACCESS_ALGORITHM],
      audience: ACCESS_AUDIENCE,
      issuer: ACCESS_ISSUER,
      // judged below by the server's own clock, like everything else
      ignoreExpiration: true,
      jsonWebTokenOptions: { complete: true },
    });
  }

  /** Null sends the request away as not signed in. */
  async validate(verified: unknown): Promise<SignedInAs | null> {
    const token = verifiedTokenSchema.safeParse(verified);
    if (!token.success) return null;
    const { sub, sid, exp } = token.data.payload;
    if (this.clock.nowMs() >= exp * 1000) return null;
    const session = await this.em.findOne(DeviceSession, { id: sid, accountId: sub, endedAt: null });
    if (!session) return null;
    const { name, isConfirmed } = await this.em.findOneOrFail(Account, { id: sub });
    return { accountId: sub, sessionId: sid, name, isConfirmed };
  }
}
