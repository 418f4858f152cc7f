import { MikroORM } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { v7 } from 'uuid';
import { answerRound } from '@harkmoor/sync-model/hub/answer-round';
import type { HubPorts } from '@harkmoor/sync-model/hub/ports';
import type { SyncAnswer, SyncRequest } from '@harkmoor/sync-model/protocol/messages';
import { Clock } from '../platform/clock/clock.js';
import { PostgresHubStore } from './postgres-hub-store.js';
import { SyncFeatures } from './sync-features.js';

/** The hub of the sync model on this server's database and clock. */
@Injectable()
export class SyncRounds {
  private readonly ports: HubPorts;

  constructor(orm: MikroORM, features: SyncFeatures, clock: Clock) {
    this.ports = {
      store: new PostgresHubStore(orm.em.getKnex(), features),
      nowMs: () => clock.nowMs(),
      newId: () => v7(),
    };
  }

  answer(accountId: string, request: SyncRequest): Promise<SyncAnswer> {
    return answerRound(this.ports, { accountId }, request);
  }
}
