import { gzipSync } from 'node:zlib';
import type { MikroORM } from '@mikro-orm/postgresql';
import { NestFactory } from '@nestjs/core';
import { JwtService } from '@nestjs/jwt';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { v7 } from 'uuid';
import type { SyncAnswer, SyncRequest } from '@harkmoor/sync-model/protocol/messages';
import {
  ACCESS_ALGORITHM,
  ACCESS_AUDIENCE,
  ACCESS_ISSUER,
  ACCESS_TYPE,
} from '../../src/accounts/access-token.js';
import { AppModule } from '../../src/app.module.js';
import { createLog, FrameworkLog } from '../../src/platform/log/log.js';
import { Secrets } from '../../src/platform/secrets/secrets.js';
import { APP_OPTIONS, setupApp } from '../../src/setup.js';

export type BenchServer = {
  readonly app: NestExpressApplication;
  /** Sends a round as the account, compressed, and gives the answer; throws where it is no success. */
  round(accountId: string, request: SyncRequest): Promise<SyncAnswer>;
};

/** The whole server, with sign-in, checks and rights on, listening on loopback. */
export async function withBenchServer<T>(
  databaseUrl: string,
  work: (server: BenchServer) => Promise<T>,
): Promise<T> {
  Object.assign(process.env, {
    DATABASE_URL: databaseUrl,
    JWT_SECRET: process.env.JWT_SECRET ?? 'a secret for measuring only, long enough',
    MAIL_URL: process.env.MAIL_URL ?? 'smtp://127.0.0.1:9',
    PUBLIC_URL: process.env.PUBLIC_URL ?? 'http://127.0.0.1',
    REQUESTS_PER_MINUTE: '10000000',
  });
  const log = createLog('error');
  const app = await NestFactory.create<NestExpressApplication>(AppModule, {
    ...APP_OPTIONS,
    logger: new FrameworkLog(log),
  });
  setupApp(app, log);
  await app.listen(0, '127.0.0.1');
  const url = `${await app.getUrl()}/api/sync`;
  try {
    return await work({ app, round: (accountId, request) => sendRound(app, url, accountId, request) });
  } finally {
    await app.close();
  }
}

async function sendRound(
  app: NestExpressApplication,
  url: string,
  accountId: string,
  request: SyncRequest,
): Promise<SyncAnswer> {
  const answer = await fetch(url, {
    method: 'POST',
    headers: {
      authorization: `Bearer ${accessToken(app, accountId)}`,
      'content-type': 'application/json',
      'content-encoding': 'gzip',
    },
    body: gzipSync(JSON.stringify(request), { level: 1 }),
  });
  if (!answer.ok) throw new Error(`the round was answered ${answer.status}: ${await answer.text()}`);
  return (await answer.json()) as SyncAnswer;
}

/** The device session has the account's own id, as `addPerson` makes it. */
function accessToken(app: NestExpressApplication, accountId: string): string {
  const jwt = new JwtService({ secret: app.get(Secrets).key('access-token') });
  return jwt.sign(
    { sub: accountId, sid: accountId },
    {
      algorithm: ACCESS_ALGORITHM,
      audience: ACCESS_AUDIENCE,
      issuer: ACCESS_ISSUER,
      expiresIn: '1h',
      header: { typ: ACCESS_TYPE, alg: ACCESS_ALGORITHM },
    },
  );
}

/** An account with an open session, member of a new club. */
export async function addPerson(orm: MikroORM): Promise<{ accountId: string; clubId: string }> {
  const [accountId, clubId] = [v7(), v7()];
  const connection = orm.em.getConnection();
  await connection.execute(
    `insert into account (id, email, name, password_hash, created_at) values (?, ?, 'Somebody', 'none', 0)`,
    [accountId, `${accountId}@harkmoor.test`],
  );
  await connection.execute(
    `insert into device_session (id, account_id, device_id, device_name, created_at, last_seen_at, pending_hash)
     values (?, ?, 'benchone', 'Bench', 0, 0, 'none')`,
    [accountId, accountId],
  );
  await connection.execute(
    `insert into club (club_id, kind, name, itu_region, demo, seq, history_id, created_at, join_code_uses_left)
     values (?, 'club', 'Moor listeners', 1, false, 1, ?, 0, 0)`,
    [clubId, v7()],
  );
  await connection.execute(
    `insert into membership (club_id, account_id, name, role, joined_at, seq, stamp)
     values (?, ?, 'Somebody', 'member', 0, 1, '000000000000' || '0000' || 'harkmoor')`,
    [clubId, accountId],
  );
  return { accountId, clubId };
}
