import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import { WholeNumberType } from '../platform/database/whole-number-type.js';

export type SessionEnd = 'signed-out' | 'signed-in-again' | 'reuse' | 'reset';

/** How long a device may stay away and still come back without a password. */
export const SESSION_IDLE_MS_MAX = 400 * 24 * 3_600_000;

/**
 * One device of one person, signed in: the family of its refresh tokens. Only hashes are kept.
 * `currentHash` is the newest token that the device has used, `pendingHash` its successor that was sent out
 * and not used yet; before the first refresh there is a pending one alone.
 */
@Entity({ tableName: 'device_session' })
export class DeviceSession {
  @PrimaryKey({ type: 'uuid' })
  readonly id: string;

  @Property({ type: 'uuid' })
  readonly accountId: string;

  @Property({ type: 'string', length: 8 })
  readonly deviceId: string;

  @Property({ type: 'string', length: 60 })
  readonly deviceName: string;

  @Property({ type: WholeNumberType })
  readonly createdAt: number;

  @Property({ type: WholeNumberType })
  lastSeenAt: number;

  @Property({ type: 'text', nullable: true })
  currentHash: string | null = null;

  @Property({ type: 'text' })
  pendingHash: string;

  @Property({ type: WholeNumberType, nullable: true })
  endedAt: number | null = null;

  @Property({ type: 'text', nullable: true })
  endReason: SessionEnd | null = null;

  constructor(made: {
    id: string;
    accountId: string;
    deviceId: string;
    deviceName: string;
    firstHash: string;
    nowMs: number;
  }) {
    this.id = made.id;
    this.accountId = made.accountId;
    this.deviceId = made.deviceId;
    this.deviceName = made.deviceName;
    this.pendingHash = made.firstHash;
    this.createdAt = made.nowMs;
    this.lastSeenAt = made.nowMs;
  }

  isOpen(nowMs: number): boolean {
    return this.endedAt === null && nowMs - this.lastSeenAt <= SESSION_IDLE_MS_MAX;
  }

  end(reason: SessionEnd, nowMs: number): void {
    if (this.endedAt !== null) return;
    this.endedAt = nowMs;
    this.endReason = reason;
  }

  /**
   * Takes a token that this session once gave out, and its successor.
   * - the pending one: it becomes the current one, and the successor is pending;
   * - the current one again, its successor unused: the answer was lost, and the same successor stays pending;
   * - an older one: somebody uses a copy, and the whole family ends.
   */
  rotate(usedHash: string, successorHash: string, nowMs: number): 'rotated' | 'reuse' {
    if (usedHash === this.pendingHash) {
      this.currentHash = usedHash;
      this.pendingHash = successorHash;
    } else if (usedHash !== this.currentHash) {
      this.end('reuse', nowMs);
      return 'reuse';
    }
    this.lastSeenAt = nowMs;
    return 'rotated';
  }
}
