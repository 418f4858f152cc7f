import type { Role } from '@harkmoor/sync-model/records/member';
import { nextStamp, SERVER_DEVICE_ID, type Stamp } from '@harkmoor/sync-model/stamp/stamp';
import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import { WholeNumberType } from '../platform/database/whole-number-type.js';

/** One person's place in a club, and the `member` record of its feed. It stays when the membership ends. */
@Entity({ tableName: 'membership' })
export class Membership {
  @PrimaryKey({ type: 'uuid' })
  readonly clubId: string;

  @PrimaryKey({ type: 'uuid' })
  readonly accountId: string;

  /** The person's name, kept with the club so that its feed needs nothing from outside. */
  @Property({ type: 'string', length: 60 })
  readonly name: string;

  @Property({ type: 'text' })
  role: Role;

  @Property({ type: WholeNumberType })
  joinedAt: number;

  @Property({ type: WholeNumberType, nullable: true })
  leftAt: number | null = null;

  @Property({ type: WholeNumberType })
  seq: number;

  @Property({ type: 'string', columnType: 'char(24)' })
  stamp: Stamp;

  constructor(made: {
    clubId: string;
    accountId: string;
    name: string;
    role: Role;
    seq: number;
    nowMs: number;
  }) {
    this.clubId = made.clubId;
    this.accountId = made.accountId;
    this.name = made.name;
    this.role = made.role;
    this.joinedAt = made.nowMs;
    this.seq = made.seq;
    this.stamp = nextStamp(SERVER_DEVICE_ID, made.nowMs, []);
  }

  get isCurrent(): boolean {
    return this.leftAt === null;
  }

  /** `seq` is the club's next one, taken under its lock. */
  changeRole(role: Role, seq: number, nowMs: number): void {
    this.role = role;
    this.touch(seq, nowMs);
  }

  /** A former member comes back as a member, whatever the role was. */
  rejoin(seq: number, nowMs: number): void {
    this.role = 'member';
    this.joinedAt = nowMs;
    this.leftAt = null;
    this.touch(seq, nowMs);
  }

  private touch(seq: number, nowMs: number): void {
    this.seq = seq;
    this.stamp = nextStamp(SERVER_DEVICE_ID, nowMs, [this.stamp]);
  }
}
