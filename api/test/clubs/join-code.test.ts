import fc from 'fast-check';
import { joinCodeSchema, newJoinCode } from '../../src/clubs/join-code.js';
import { makeApp, type TestApp } from '../app.js';
import { MailCatcher } from '../mail-catcher.js';
import { foundClub, makePerson, makeUnconfirmed, type Person } from '../people.js';

const mail = new MailCatcher();
let server: TestApp;
let admin: Person;
let guest: Person;
beforeAll(async () => {
  server = await makeApp({ MAIL_URL: await mail.start() });
  admin = await makePerson(server, mail, 'Karen Hede');
  guest = await makeUnconfirmed(server, 'Niels Vig');
});
afterAll(async () => {
  await server.close();
  await mail.stop();
});

const join = (person: Person, code: string) => person.visitor.post('/api/clubs/join', { code });

test('should read a code back however it is typed', () => {
  fc.assert(
    fc.property(fc.nat(9), fc.boolean(), (cut, isLower) => {
      const code = newJoinCode();
      const typed = `${code.slice(0, cut)}-${code.slice(cut)} `.replace(/0/g, 'o').replace(/1/g, 'l');
      expect(joinCodeSchema.parse(isLower ? typed.toLowerCase() : typed)).toBe(code);
    }),
  );
  expect(newJoinCode()).toMatch(/^[0-9A-HJKMNP-TV-Z]{10}$/);
});

test('should keep no code in the database', async () => {
  const { clubId, code } = await foundClub(admin);
  const rows = await server.orm.em
    .getConnection()
    .execute<object[]>('select * from club where club_id = ?', [clubId]);
  expect(JSON.stringify(rows)).not.toContain(code);
});

test('should answer one sentence to codes that are wrong, replaced, or too old', async () => {
  const { clubId, code } = await foundClub(admin);
  const wrong = await join(guest, '0000000000');
  expect([wrong.status, wrong.body.code]).toEqual([404, 'code-unknown']);

  const { body } = await admin.visitor.post(`/api/clubs/${clubId}/join-code`);
  expect((await join(guest, code)).body.message).toBe(wrong.body.message);

  server.clock.pass(14 * 24 * 3_600_000);
  await guest.visitor.signIn(guest.email, 'seven grey gulls');
  expect((await join(guest, body.code as string)).body.message).toBe(wrong.body.message);
  await admin.visitor.signIn(admin.email, 'seven grey gulls');
});

test('should use a code up, one place for each who joins', async () => {
  const { clubId, code } = await foundClub(admin);
  const execute = (sql: string) => server.orm.em.getConnection().execute<{ left: number }[]>(sql, [clubId]);
  await execute('update club set join_code_uses_left = 1 where club_id = ?');
  expect((await join(guest, code)).status).toBe(200);
  expect((await join(guest, code)).status).toBe(404); // used up, also for those who are in
  const [row] = await execute('select join_code_uses_left as left from club where club_id = ?');
  expect(row!.left).toBe(0);
});

test('should let one person in once where they join twice at once', async () => {
  const { clubId, code } = await foundClub(admin);
  const answers = await Promise.all([join(guest, code), join(guest, code), join(guest, code)]);
  expect(answers.map(({ status }) => status)).toEqual([200, 200, 200]);
  const rows = await server.orm.em
    .getConnection()
    .execute<{ uses: number }[]>('select join_code_uses_left as uses from club where club_id = ?', [clubId]);
  expect(rows[0]!.uses).toBe(49);
});

test('should take a former member back as member', async () => {
  const { clubId, code } = await foundClub(admin);
  await join(guest, code);
  await server.orm.em
    .getConnection()
    .execute(
      `update membership set left_at = joined_at, role = 'admin' where club_id = ? and account_id = ?`,
      [clubId, guest.accountId],
    );
  expect((await guest.visitor.get(`/api/clubs/${clubId}`)).status).toBe(404);
  expect((await join(guest, code)).body.role).toBe('member');
});

test('should stop somebody who guesses', async () => {
  const guesser = await makeUnconfirmed(server, 'Per Prik');
  const statuses: number[] = [];
  for (let n = 0; n < 21; n += 1) statuses.push((await join(guesser, newJoinCode())).status);
  expect(statuses).toEqual([...Array.from({ length: 20 }, () => 404), 429]);
});
