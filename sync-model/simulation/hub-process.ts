import { answerRound } from '../src/hub/answer-round.js';
import type { HubStore } from '../src/hub/ports.js';
import type { RoundLimits } from '../src/protocol/limits.js';
import type { SyncAnswer, SyncRequest } from '../src/protocol/messages.js';
import type { MemoryHub } from './memory-hub.js';
import { idOf } from './people.js';
import type { Scheduler } from './scheduler.js';

type HubWorld = {
  readonly nowMs: () => number;
  readonly limits: RoundLimits;
  readonly onAnswer: (answer: SyncAnswer) => void;
  readonly onError: (error: unknown) => void;
};

/** The server: the real hub half on the database in memory. It may crash in the middle of any round. */
export class HubProcess {
  private made = 0x9000_0000;
  private crash: () => void = () => {};
  private crashed = this.nextCrash();

  constructor(
    private readonly database: MemoryHub,
    private readonly store: HubStore,
    private readonly scheduler: Scheduler,
    private readonly world: HubWorld,
  ) {}

  async answer(accountId: string, request: SyncRequest): Promise<SyncAnswer | 'crashed'> {
    const { nowMs, limits, onAnswer, onError } = this.world;
    const ports = { store: this.store, nowMs, newId: () => idOf((this.made += 1)) };
    const answer = answerRound(ports, { accountId }, request, limits).catch((error: unknown) => {
      onError(error);
      return 'crashed' as const;
    });
    const told = await Promise.race([answer, this.crashed]);
    if (told !== 'crashed') onAnswer(told);
    return told;
  }

  /** What was not committed is gone; whoever waits for an answer gets none. */
  restart(): void {
    this.scheduler.kill(this.database.life);
    this.crash();
    this.crashed = this.nextCrash();
    this.database.restart({ name: 'hub', isDead: false });
  }

  private nextCrash(): Promise<'crashed'> {
    return new Promise((resolve) => {
      this.crash = () => resolve('crashed');
    });
  }
}
