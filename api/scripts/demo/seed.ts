import 'reflect-metadata';
import { writeFileSync } from 'node:fs';
import path from 'node:path';
import { EntityManager, MikroORM } from '@mikro-orm/postgresql';
import { NestFactory } from '@nestjs/core';
import { AppModule } from '../../src/app.module.js';
import { Club } from '../../src/clubs/club.entity.js';
import { databaseOptions } from '../../src/mikro-orm.config.js';
import { loadConfiguration } from '../../src/platform/configuration/configuration.js';
import { SyncRounds } from '../../src/sync/sync-rounds.js';
import { ensureDemoAccounts } from './demo-accounts.js';
import { makeDemoClub } from './demo-club.js';
import { DEMO_CLUB_NAME, DEMO_PASSWORD, DEMO_PEOPLE } from './demo-people.js';
import { demoTruth } from './demo-truth.js';
import { pushDemo } from './push-demo.js';

/** Makes the demo club where there is none; finishes one that was cut off; leaves a whole one alone. */
async function seed(): Promise<void> {
  const { databaseUrl } = loadConfiguration(process.env);
  const dataFolder = process.env.HARKMOOR_DATA;
  if (!dataFolder) throw new Error('HARKMOOR_DATA must name the data folder');
  const demo = makeDemoClub();
  const inClub = demo.changes.filter((row) => row.log === 'club').length;
  if ((await storedSeq(databaseUrl)) < inClub) {
    const app = await NestFactory.createApplicationContext(AppModule, { logger: ['error'] });
    try {
      const nowMs = Date.now();
      const homes = await ensureDemoAccounts(app.get(EntityManager).fork(), nowMs);
      const rounds = app.get(SyncRounds);
      await pushDemo((accountId, request) => rounds.answer(accountId, request), demo.changes, homes, nowMs);
    } finally {
      await app.close();
    }
  }
  writeTruth(dataFolder);
}

/** How far the demo club's feed is; 0 where there is no demo club. */
async function storedSeq(databaseUrl: string): Promise<number> {
  const orm = await MikroORM.init(databaseOptions(databaseUrl));
  try {
    return (await orm.em.fork().findOne(Club, { name: DEMO_CLUB_NAME, demo: true }))?.seq ?? 0;
  } finally {
    await orm.close();
  }
}

function writeTruth(dataFolder: string): void {
  const signIns = DEMO_PEOPLE.slice(0, 3).map(({ role, email, name }) => ({
    role,
    email,
    name,
    password: DEMO_PASSWORD,
  }));
  writeFileSync(path.join(dataFolder, 'demo-truth.json'), JSON.stringify(demoTruth(), null, 1));
  writeFileSync(path.join(dataFolder, 'demo-sign-ins.json'), JSON.stringify(signIns, null, 1));
}

await seed();
