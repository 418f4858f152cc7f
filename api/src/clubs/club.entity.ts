import type { ClubCard, ClubKind } from '@harkmoor/sync-model/protocol/messages';
import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import { WholeNumberType } from '../platform/database/whole-number-type.js';

export type ItuRegion = 1 | 2 | 3;

export const JOIN_CODE_LIFE_MS = 14 * 24 * 3_600_000;
export const JOIN_CODE_USES_MAX = 50;

/** The tenant: every record belongs to one club. My log is a club of one. */
@Entity({ tableName: 'club' })
export class Club {
  @PrimaryKey({ type: 'uuid', fieldName: 'club_id' })
  readonly id: string;

  @Property({ type: 'text' })
  readonly kind: ClubKind;

  @Property({ type: 'string', length: 60 })
  readonly name: string;

  @Property({ type: 'smallint' })
  readonly ituRegion: ItuRegion;

  /** Invented, and never mixed into a real club. */
  @Property({ type: 'boolean' })
  readonly demo: boolean;

  /** The newest `seq` of the club's feed; raised only under the lock of this row. */
  @Property({ type: WholeNumberType })
  seq = 0;

  /** Changes when the server was restored from a backup. */
  @Property({ type: 'uuid' })
  readonly historyId: string;

  @Property({ type: WholeNumberType })
  readonly createdAt: number;

  @Property({ type: 'text', nullable: true })
  joinCodeHash: string | null = null;

  @Property({ type: WholeNumberType, nullable: true })
  joinCodeExpiresAt: number | null = null;

  @Property({ type: 'integer' })
  joinCodeUsesLeft = 0;

  constructor(made: {
    id: string;
    kind: ClubKind;
    name: string;
    ituRegion: ItuRegion;
    demo: boolean;
    historyId: string;
    nowMs: number;
  }) {
    this.id = made.id;
    this.kind = made.kind;
    this.name = made.name;
    this.ituRegion = made.ituRegion;
    this.demo = made.demo;
    this.historyId = made.historyId;
    this.createdAt = made.nowMs;
  }

  /** What a phone must know of the club beside its records. */
  card(): ClubCard {
    return { name: this.name, kind: this.kind, ituRegion: this.ituRegion, demo: this.demo };
  }

  /** The next place in the feed; only for a caller that holds the lock of this row. */
  takeSeq(): number {
    this.seq += 1;
    return this.seq;
  }

  /** A new code replaces the one before; returns until when it opens the club. */
  openToCode(codeHash: string, nowMs: number): number {
    if (this.kind === 'my-log') throw new Error('My log is never shared');
    const expiresAt = nowMs + JOIN_CODE_LIFE_MS;
    this.joinCodeHash = codeHash;
    this.joinCodeExpiresAt = expiresAt;
    this.joinCodeUsesLeft = JOIN_CODE_USES_MAX;
    return expiresAt;
  }

  isOpenTo(codeHash: string, nowMs: number): boolean {
    return (
      this.joinCodeHash === codeHash &&
      this.joinCodeExpiresAt !== null &&
      nowMs < this.joinCodeExpiresAt &&
      this.joinCodeUsesLeft > 0
    );
  }

  useJoinCode(): void {
    if (this.joinCodeUsesLeft < 1) throw new Error('a join code was used beyond its limit');
    this.joinCodeUsesLeft -= 1;
  }
}
