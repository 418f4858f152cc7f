import 'reflect-metadata';
import { randomBytes } from 'node:crypto';
import { MikroORM } from '@mikro-orm/postgresql';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { Test } from '@nestjs/testing';
import { AppModule } from '../src/app.module.js';
import { databaseOptions } from '../src/mikro-orm.config.js';
import { Clock } from '../src/platform/clock/clock.js';
import { Configuration, loadConfiguration } from '../src/platform/configuration/configuration.js';
import { createLog, FrameworkLog } from '../src/platform/log/log.js';
import { APP_OPTIONS, setupApp } from '../src/setup.js';
import { SettableClock } from './settable-clock.js';

export type TestApp = {
  readonly app: NestExpressApplication;
  /** Where it listens, without a slash at the end. */
  readonly url: string;
  readonly orm: MikroORM;
  readonly clock: SettableClock;
  close(): Promise<void>;
};

/** The whole server, listening, on a database of this test file's own, so that files can run side by side. */
export async function makeApp(environment: Record<string, string> = {}): Promise<TestApp> {
  const databaseUrl = freshDatabaseUrl();
  await migrate(databaseUrl);
  const configuration = loadConfiguration({
    DATABASE_URL: databaseUrl,
    JWT_SECRET: 'a secret for tests, long enough to be taken',
    MAIL_URL: 'smtp://127.0.0.1:9',
    PUBLIC_URL: 'http://harkmoor.test',
    LOG_LEVEL: 'error',
    REQUESTS_PER_MINUTE: '1000000',
    PWA_DIR: '/nonexistent',
    ...environment,
  });
  const clock = new SettableClock();
  const module = await Test.createTestingModule({ imports: [AppModule] })
    .overrideProvider(Configuration)
    .useValue(configuration)
    .overrideProvider(Clock)
    .useValue(clock)
    .compile();
  const log = createLog(configuration.logLevel);
  const app = module.createNestApplication<NestExpressApplication>({
    ...APP_OPTIONS,
    logger: new FrameworkLog(log),
  });
  setupApp(app, log);
  await app.listen(0, '127.0.0.1');
  const orm = app.get<MikroORM>(MikroORM);
  return { app, url: await app.getUrl(), orm, clock, close: () => closeApp(app, databaseUrl) };
}

function freshDatabaseUrl(): string {
  const base = process.env.TEST_DATABASE_URL;
  if (!base) throw new Error('TEST_DATABASE_URL is not set: the global set-up of the tests did not run');
  const url = new URL(base);
  url.pathname = `/t_${randomBytes(6).toString('hex')}`;
  return url.href;
}

async function migrate(databaseUrl: string): Promise<void> {
  const orm = await MikroORM.init(databaseOptions(databaseUrl, 2));
  await orm.schema.ensureDatabase();
  await orm.migrator.up();
  await orm.close();
}

async function closeApp(app: NestExpressApplication, databaseUrl: string): Promise<void> {
  await app.close();
  const orm = await MikroORM.init(databaseOptions(databaseUrl, 2));
  await orm.schema.dropDatabase();
  await orm.close();
}
