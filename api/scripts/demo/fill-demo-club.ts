import { EntityManager } from '@mikro-orm/postgresql';
import { NestFactory } from '@nestjs/core';
import { AppModule } from '../../src/app.module.js';
import { SyncRounds } from '../../src/sync/sync-rounds.js';
import { ensureDemoAccounts } from './demo-accounts.js';
import { makeDemoClub } from './demo-club.js';
import { pushDemo } from './push-demo.js';

/** Makes accounts, club and records of the demo, each that is missing; returns how many records the club then has. */
export async function fillDemoClub(): Promise<number> {
  const { changes } = makeDemoClub();
  const app = await NestFactory.createApplicationContext(AppModule, { logger: ['error'] });
  try {
    const nowMs = Date.now();
    const homes = await ensureDemoAccounts(app.get(EntityManager).fork(), nowMs);
    const rounds = app.get(SyncRounds);
    await pushDemo((accountId, request) => rounds.answer(accountId, request), changes, homes, nowMs);
    return changes.filter((row) => row.log === 'club').length;
  } finally {
    await app.close();
  }
}
