import { v7 } from 'uuid';
import { nextStamp } from '@harkmoor/sync-model/stamp/stamp';
import { makeApp, type TestApp } from '../app.js';
import { MailCatcher } from '../mail-catcher.js';
import { foundClub, makePerson, type Person } from '../people.js';
import { EventReader } from './event-reader.js';

const mail = new MailCatcher();
let server: TestApp;
let anna: Person;
let bo: Person;
let outsider: Person;
let clubId: string;
const open: EventReader[] = [];

beforeAll(async () => {
  server = await makeApp({ MAIL_URL: await mail.start(), MAILS_PER_NETWORK_PER_HOUR: '1000' });
  anna = await makePerson(server, mail, 'Anna Klit');
  bo = await makePerson(server, mail, 'Bo Marram');
  outsider = await makePerson(server, mail, 'Out Sider');
  const founded = await foundClub(anna);
  clubId = founded.clubId;
  await bo.visitor.post('/api/clubs/join', { code: founded.code });
});
afterEach(() => {
  for (const reader of open.splice(0)) reader.close();
});
afterAll(async () => {
  await server.close();
  await mail.stop();
});

/** An open stream of which the beginning, where each club stands, was read. */
async function stream(person: Person, clubs: number): Promise<{ reader: EventReader; first: unknown[] }> {
  const reader = await EventReader.open(server.url, person.visitor);
  open.push(reader);
  const first: unknown[] = [];
  for (let read = 0; read < clubs; read += 1) first.push((await reader.next())?.data);
  return { reader, first };
}

/** One new record of Anna's; gives the club's new `seq`. */
async function log(inClub = clubId, person = anna): Promise<number> {
  const deviceAt = Date.now();
  const fields = { deviceId: 'phone001', deviceAt, offsetMs: 0, uncertaintyMs: 500, method: 'tone' };
  const change = { type: 'clock-check', id: v7(), at: nextStamp('phone001', deviceAt, []), fields };
  const { body } = await person.visitor.post('/api/sync', {
    protocol: 1,
    deviceId: 'phone001',
    sentAt: deviceAt,
    clubs: [{ clubId: inClub, historyId: null, cursor: 0, changes: [change] }],
  });
  const clubs = body.clubs as { clubId: string; headSeq: number }[];
  return clubs.find((club) => club.clubId === inClub)!.headSeq;
}

test('should say where each club of the caller stands, then each step, and nothing else', async () => {
  const before = await log();
  const { reader, first } = await stream(bo, 2);
  expect(first).toEqual(
    expect.arrayContaining([
      { clubId, seq: before },
      { clubId: bo.myLogId, seq: expect.any(Number) as number },
    ]),
  );
  const seq = await log();
  expect(seq).toBeGreaterThan(before);
  expect(await reader.next()).toEqual({ type: 'seq', data: { clubId, seq } });
});

test('should tell nobody of a club that they are not in', async () => {
  const { reader, first } = await stream(outsider, 1);
  expect(JSON.stringify(first)).not.toContain(clubId);
  await log();
  const seq = await log(outsider.myLogId, outsider);
  // the club's notice would have come first
  expect(await reader.next()).toEqual({ type: 'seq', data: { clubId: outsider.myLogId, seq } });
});

test('should tell of a club from the moment of joining', async () => {
  const late = await makePerson(server, mail, 'Late Comer');
  const { reader } = await stream(late, 1);
  const { body } = await anna.visitor.post(`/api/clubs/${clubId}/join-code`);
  await late.visitor.post('/api/clubs/join', { code: body.code });
  expect((await reader.next())?.data).toMatchObject({ clubId });
});

test('should end at the first notice after the membership has ended', async () => {
  const { reader } = await stream(bo, 2);
  const staying = await stream(anna, 2);
  const ended = 'update membership set left_at = ? where club_id = ? and account_id = ?';
  const connection = server.orm.em.getConnection();
  await connection.execute(ended, [Date.now(), clubId, bo.accountId]);
  const seq = await log();
  expect(await reader.next()).toBeNull();
  expect(await staying.reader.next()).toEqual({ type: 'seq', data: { clubId, seq } });
  await connection.execute(ended, [null, clubId, bo.accountId]);
});

test('should end the streams when notices may have been lost, and listen again for the next', async () => {
  const { reader } = await stream(anna, 2);
  expect(await listeners()).toBe(1);
  await server.orm.em
    .getConnection()
    .execute(`select pg_terminate_backend(pid) from pg_stat_activity where ${LISTENING}`);
  expect(await reader.next()).toBeNull();
  const again = await stream(anna, 2);
  const seq = await log();
  expect(await again.reader.next()).toEqual({ type: 'seq', data: { clubId, seq } });
});

test('should hold one connection for all streams', async () => {
  for (let opened = 0; opened < 30; opened += 1) await stream(anna, 2);
  expect(await listeners()).toBe(1);
});

test('should say nothing of a change that was rolled back', async () => {
  const { reader } = await stream(anna, 2);
  const connection = server.orm.em.getConnection();
  const raise = 'update club set seq = seq + 1000 where club_id = ?';
  await connection
    .transactional(async (tx) => {
      await connection.execute(raise, [clubId], 'run', tx);
      throw new Error('rolled back');
    })
    .catch(() => undefined);
  const seq = await log();
  expect(seq).toBeLessThan(1000);
  expect(await reader.next()).toEqual({ type: 'seq', data: { clubId, seq } });
});

const LISTENING = `datname = current_database() and query = 'listen club_seq'`;

async function listeners(): Promise<number> {
  const [row] = await server.orm.em
    .getConnection()
    .execute<{ count: string }[]>(`select count(*) from pg_stat_activity where ${LISTENING}`);
  return Number(row!.count);
}
