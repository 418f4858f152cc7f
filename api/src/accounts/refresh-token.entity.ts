import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import { WholeNumberType } from '../platform/database/whole-number-type.js';

/** That a token was given out by a session: what tells a spent token from an invented one. */
@Entity({ tableName: 'refresh_token' })
export class RefreshToken {
  @PrimaryKey({ type: 'text' })
  readonly tokenHash: string;

  @Property({ type: 'uuid' })
  readonly sessionId: string;

  @Property({ type: WholeNumberType })
  readonly issuedAt: number;

  constructor(tokenHash: string, sessionId: string, issuedAt: number) {
    this.tokenHash = tokenHash;
    this.sessionId = sessionId;
    this.issuedAt = issuedAt;
  }
}
