import fc from 'fast-check';
import { resetSchema, signInSchema } from '../../src/accounts/account-schemas.js';
import { hashPassword, needsRehash, passwordFits } from '../../src/accounts/password.js';
import { makeApp, type TestApp } from '../app.js';
import { linkTokenOf, MailCatcher } from '../mail-catcher.js';
import { makePerson, PASSWORD } from '../people.js';
import { Visitor } from '../visitor.js';

const mail = new MailCatcher();
let server: TestApp;
beforeAll(async () => {
  server = await makeApp({ MAIL_URL: await mail.start() });
});
afterAll(async () => {
  await server.close();
  await mail.stop();
});

// OWASP Password Storage Cheat Sheet: Argon2id with at least m = 19 456 KiB, t = 2, p = 1
test('should hash with argon2id at the recommended cost', async () => {
  const hash = await hashPassword(PASSWORD);
  const [, name, version, cost] = hash.split('$');
  expect([name, version, cost]).toEqual(['argon2id', 'v=19', 'm=19456,t=2,p=1']);
  expect(needsRehash(hash)).toBe(false);
  expect(needsRehash('$argon2id$v=19$m=15360,t=2,p=1$AAAA$BBBB')).toBe(true);
  expect(await passwordFits(hash, PASSWORD)).toBe(true);
  expect(await passwordFits(hash, `${PASSWORD} `)).toBe(false);
  expect(await passwordFits(undefined, PASSWORD)).toBe(false);
});

test('should take a password from any keyboard: composed and decomposed letters are the same', () => {
  const password = (text: string) => resetSchema.parse({ token: 'A'.repeat(43), password: text }).password;
  fc.assert(
    fc.property(fc.string({ unit: 'grapheme', minLength: 10, maxLength: 40 }), (text) => {
      if ([...text.normalize('NFKC')].length < 10 || [...text.normalize('NFKC')].length > 128) return;
      expect(password(text.normalize('NFD'))).toBe(password(text.normalize('NFC')));
    }),
  );
});

test.each([
  ['nine characters', 'ninechars', false],
  ['ten characters', 'tencharact', true],
  ['128 characters', 'x'.repeat(128), true],
  ['129 characters', 'x'.repeat(129), false],
  ['letters alone', 'onlysmallletters', true],
  ['ten characters beyond the first plane', '🌊'.repeat(10), true],
])('should judge a password of %s', (_, password, isTaken) => {
  expect(resetSchema.safeParse({ token: 'A'.repeat(43), password }).success).toBe(isTaken);
  const signIn = { email: 'a@b.test', password, deviceId: 'phone001', deviceName: 'Phone' };
  expect(signInSchema.safeParse(signIn).success).toBe(true);
});

test('should set a new password by mail and sign out every device', async () => {
  const person = await makePerson(server, mail, 'Rikke Sand');
  const laptop = new Visitor(server.url);
  await laptop.signIn(person.email, PASSWORD, 'laptop01');
  await laptop.post('/api/accounts/reset-request', { email: person.email });
  const token = linkTokenOf(await mail.mailTo(person.email, 2), '/account/reset');

  const password = 'eight brown curlews';
  expect((await laptop.post('/api/accounts/reset', { token, password })).status).toBe(200);
  for (const device of [laptop, person.visitor]) {
    expect((await device.get('/api/accounts/me')).status).toBe(401);
    expect((await device.post('/api/accounts/refresh')).status).toBe(401);
  }
  expect((await laptop.signIn(person.email, PASSWORD)).status).toBe(401);
  expect((await laptop.signIn(person.email, password)).status).toBe(200);

  const again = await laptop.post('/api/accounts/reset', { token, password: PASSWORD });
  expect([again.status, again.body.code]).toEqual([400, 'link-spent']);
});

test('should let only one of two clicks on a link win', async () => {
  const { email } = await makePerson(server, mail, 'Two Clicks');
  const visitor = new Visitor(server.url);
  await visitor.post('/api/accounts/reset-request', { email });
  const token = linkTokenOf(await mail.mailTo(email, 2), '/account/reset');
  const clicks = ['first password', 'second password'].map((password) =>
    visitor.post('/api/accounts/reset', { token, password }),
  );
  expect((await Promise.all(clicks)).map(({ status }) => status).sort()).toEqual([200, 400]);
});

test('should refuse a reset link after 30 minutes, and a confirming link as one', async () => {
  const { email } = await makePerson(server, mail, 'Slow Reader');
  const visitor = new Visitor(server.url);
  const confirmToken = linkTokenOf(await mail.mailTo(email), '/account/confirm');
  await visitor.post('/api/accounts/reset-request', { email });
  const token = linkTokenOf(await mail.mailTo(email, 2), '/account/reset');
  server.clock.pass(30 * 60_000);
  for (const spent of [token, confirmToken]) {
    const { status, body } = await visitor.post('/api/accounts/reset', { token: spent, password: PASSWORD });
    expect([status, body.code]).toEqual([400, 'link-spent']);
  }
});

test('should keep no link’s token in the database', async () => {
  const { email } = await makePerson(server, mail, 'No Trace');
  const token = linkTokenOf(await mail.mailTo(email), '/account/confirm');
  const connection = server.orm.em.getConnection();
  for (const table of ['mail_token', 'outgoing_mail']) {
    const rows = await connection.execute<object[]>(`select * from ${table}`);
    expect(JSON.stringify(rows)).not.toContain(token);
  }
});
