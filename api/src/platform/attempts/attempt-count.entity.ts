import { Entity, PrimaryKey, Property } from '@mikro-orm/core';
import { WholeNumberType } from '../database/whole-number-type.js';

/**
 * How many tries are free, for how long they are remembered after the last (`growing`) or first (`window`) one,
 * and how long the next must wait. A growing wait doubles with each try, up to its maximum.
 */
export type AttemptRule =
  | {
      readonly kind: 'growing';
      readonly free: number;
      readonly firstWaitMs: number;
      readonly waitMsMax: number;
    }
  | { readonly kind: 'window'; readonly free: number };

export const REMEMBERED_MS = 3_600_000;

/** How often something was tried of late; the key is a keyed hash, so that the table names nobody. */
@Entity({ tableName: 'attempt_count' })
export class AttemptCount {
  @PrimaryKey({ type: 'text' })
  readonly keyHash: string;

  @Property({ type: 'integer' })
  tries = 0;

  @Property({ type: WholeNumberType })
  firstAt: number;

  @Property({ type: WholeNumberType })
  lastAt: number;

  constructor(keyHash: string, nowMs: number) {
    this.keyHash = keyHash;
    this.firstAt = nowMs;
    this.lastAt = nowMs;
  }

  /** Counts a try and returns 0, or how many ms it must wait; a try that must wait is not counted. */
  take(rule: AttemptRule, nowMs: number): number {
    const rememberedFrom = rule.kind === 'growing' ? this.lastAt : this.firstAt;
    if (nowMs - rememberedFrom >= REMEMBERED_MS) {
      this.tries = 0;
      this.firstAt = nowMs;
    }
    const waitMs = this.waitMs(rule, nowMs);
    if (waitMs > 0) return waitMs;
    this.tries += 1;
    this.lastAt = nowMs;
    return 0;
  }

  private waitMs(rule: AttemptRule, nowMs: number): number {
    const over = this.tries - rule.free;
    if (over < 0) return 0;
    if (rule.kind === 'window') return this.firstAt + REMEMBERED_MS - nowMs;
    const pauseMs = Math.min(rule.waitMsMax, rule.firstWaitMs * 2 ** Math.min(over, 30));
    return Math.max(0, this.lastAt + pauseMs - nowMs);
  }
}
