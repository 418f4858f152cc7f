import { makeApp, type TestApp } from '../app.js';
import { MailCatcher } from '../mail-catcher.js';
import { makePerson, makeUnconfirmed, PASSWORD } from '../people.js';
import { pause } from '../mail-catcher.js';
import { Visitor } from '../visitor.js';

const mail = new MailCatcher();
let server: TestApp;
beforeAll(async () => {
  const MAIL_URL = await mail.start();
  server = await makeApp({
    MAIL_URL,
    SIGN_IN_TRIES: '5',
    MAILS_PER_ADDRESS_PER_HOUR: '2',
    MAILS_PER_NETWORK_PER_HOUR: '12',
  });
});
afterAll(async () => {
  await server.close();
  await mail.stop();
});

test('should let only five of many parallel guesses through, then wait longer and longer', async () => {
  const { email } = await makeUnconfirmed(server, 'Guessed At');
  const visitor = new Visitor(server.url);
  const guesses = await Promise.all(
    Array.from({ length: 12 }, (_, n) => visitor.signIn(email, `guess ${n}`)),
  );
  expect(guesses.filter(({ status }) => status === 401)).toHaveLength(5);
  const waiting = guesses.filter(({ status }) => status === 429);
  expect(waiting).toHaveLength(7);
  expect(waiting[0]!.headers.get('retry-after')).toMatch(/^(59|60)$/);
  expect(waiting[0]!.body.code).toBe('too-many');

  // neither another spelling nor a made-up proxy header opens the way, and the right password waits too
  const header = { 'X-Forwarded-For': '203.0.113.7' };
  const body = { email: email.toUpperCase(), password: PASSWORD, deviceId: 'phone001', deviceName: 'Phone' };
  expect((await visitor.post('/api/accounts/sign-in', body, { headers: header })).status).toBe(429);

  server.clock.pass(60_000);
  expect((await visitor.signIn(email, 'guess 13')).status).toBe(401);
  const next = await visitor.signIn(email, PASSWORD);
  expect(next.status).toBe(429);
  expect(Number(next.headers.get('retry-after'))).toBeGreaterThan(100);
  server.clock.pass(120_000);
  expect((await visitor.signIn(email, PASSWORD)).status).toBe(200);
  expect((await visitor.signIn(email, 'a slip')).status).toBe(401);
});

test('should send one address few mails an hour and say nothing of it', async () => {
  const { email } = await makePerson(server, mail, 'Much Mailed');
  const visitor = new Visitor(server.url);
  for (let time = 0; time < 4; time += 1) {
    expect((await visitor.post('/api/accounts/reset-request', { email })).status).toBe(202);
  }
  await mail.mailTo(email, 3);
  await pause(200);
  expect(mail.mails.filter(({ to }) => to === email)).toHaveLength(3); // the confirming one and two more
});

test('should let one network cause only so many mails an hour', async () => {
  const visitor = new Visitor(server.url);
  const statuses: number[] = [];
  for (let n = 0; n < 12; n += 1) {
    const { status } = await visitor.post('/api/accounts/reset-request', { email: `n${n}@harkmoor.test` });
    statuses.push(status);
  }
  expect(statuses.filter((status) => status === 429).length).toBeGreaterThan(0);
  expect(new Set(statuses)).toEqual(new Set([202, 429]));
});

test('should name nobody in the table of counts', async () => {
  const rows = await server.orm.em.getConnection().execute<object[]>('select * from attempt_count');
  expect(rows.length).toBeGreaterThan(0);
  expect(JSON.stringify(rows)).not.toMatch(/harkmoor\.test|127\.0\.0\.1/);
});
