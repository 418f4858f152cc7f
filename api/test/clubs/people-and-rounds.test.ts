import { nextStamp } from '@harkmoor/sync-model/stamp/stamp';
import { v7 as newId } from 'uuid';
import { makeApp, type TestApp } from '../app.js';
import { MailCatcher } from '../mail-catcher.js';
import { foundClub, makePerson, makeUnconfirmed, type Person } from '../people.js';

const mail = new MailCatcher();
let server: TestApp;
beforeAll(async () => {
  server = await makeApp({ MAIL_URL: await mail.start() });
});
afterAll(async () => {
  await server.close();
  await mail.stop();
});

/** A round that sends one new clock check. */
function sendOne(person: Person, clubId: string) {
  const now = Date.now();
  const fields = { deviceId: 'phone001', deviceAt: now, offsetMs: 0, uncertaintyMs: 500, method: 'tone' };
  const change = { type: 'clock-check', id: newId(), at: nextStamp('phone001', now, []), fields };
  const clubs = [{ clubId, historyId: null, cursor: 0, changes: [change] }];
  return person.visitor.post('/api/sync', { protocol: 1, deviceId: 'phone001', sentAt: now, clubs });
}

test('should let rounds, changes of role and joining go on beside each other, each with its own place in the feed', async () => {
  const admin = await makePerson(server, mail, 'Busy Admin');
  const member = await makeUnconfirmed(server, 'Busy Member');
  const { clubId, code } = await foundClub(admin);
  await member.visitor.post('/api/clubs/join', { code });
  const member$ = `/api/clubs/${clubId}/members/${member.accountId}`;
  const joiners = await Promise.all(
    Array.from({ length: 5 }, (_, n) => makeUnconfirmed(server, `Joiner ${n}`)),
  );

  const work = Array.from({ length: 40 }, (_, n) => [
    sendOne(member, clubId),
    sendOne(admin, clubId),
    admin.visitor.patch(member$, { role: n % 2 === 0 ? 'organizer' : 'member' }),
    ...(n < joiners.length ? [joiners[n]!.visitor.post('/api/clubs/join', { code })] : []),
  ]).flat();
  const statuses = (await Promise.all(work)).map(({ status }) => status);
  expect(statuses.filter((status) => status !== 200)).toEqual([]);

  const seqs = await server.orm.em
    .getConnection()
    .execute<{ seq: string }[]>(
      `select seq from membership where club_id = ? union all select seq from clock_check where club_id = ?`,
      [clubId, clubId],
    );
  expect(new Set(seqs.map(({ seq }) => seq)).size).toBe(seqs.length);
  expect(seqs).toHaveLength(2 + joiners.length + 80);
});
