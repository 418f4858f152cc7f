import { signedInSchema, whoAmISchema } from '../../src/accounts/account-schemas.js';
import { makeApp, type TestApp } from '../app.js';
import { linkTokenOf, MailCatcher } from '../mail-catcher.js';
import { PASSWORD } from '../people.js';
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

const signUp = { name: 'Signe Lyng', email: ' Signe.Lyng@Harkmoor.test ', password: PASSWORD };

test('should lead from sign-up by mail to a signed-in device and out again', async () => {
  const visitor = new Visitor(server.url);
  const signedUp = await visitor.post('/api/accounts/sign-up', signUp);
  expect([signedUp.status, signedUp.body]).toEqual([202, { status: 'accepted' }]);

  // logging does not wait for the mail: an unconfirmed person signs in and has My log
  const first = await visitor.signIn('signe.lyng@harkmoor.test', PASSWORD);
  const { account, clubs } = signedInSchema.parse(first.body);
  expect(account).toMatchObject({ name: 'Signe Lyng', email: 'signe.lyng@harkmoor.test', confirmed: false });
  const card = { name: 'My log', kind: 'my-log', ituRegion: 1, demo: false };
  expect(clubs).toEqual([{ clubId: expect.any(String) as string, role: 'admin', card }]);
  const cookie = first.headers.getSetCookie()[0]!;
  expect(cookie).toMatch(
    /^harkmoor_refresh_80=[\w-]{43}; Max-Age=\d+; Path=\/api\/accounts; Expires=[^;]+; HttpOnly; SameSite=Strict$/,
  );

  const token = linkTokenOf(await mail.mailTo('signe.lyng@harkmoor.test'), '/account/confirm');
  expect((await visitor.post('/api/accounts/confirm', { token })).status).toBe(200);
  const again = await visitor.post('/api/accounts/confirm', { token });
  expect([again.status, again.body.code]).toEqual([400, 'link-spent']);

  const me = await visitor.get('/api/accounts/me');
  expect(whoAmISchema.parse(me.body).account.confirmed).toBe(true);

  const refreshed = await visitor.post('/api/accounts/refresh');
  expect(signedInSchema.parse(refreshed.body).account.id).toBe(account.id);

  expect((await visitor.post('/api/accounts/sign-out')).status).toBe(204);
  expect(visitor.cookie).toBeNull();
  // the access token is not out of date yet; its session is over all the same
  expect((await visitor.get('/api/accounts/me')).status).toBe(401);
});

test('should make the cookie secure where people come by https', async () => {
  const secure = await makeApp({ MAIL_URL: 'smtp://127.0.0.1:9', PUBLIC_URL: 'https://harkmoor.test' });
  const visitor = new Visitor(secure.url);
  await visitor.post('/api/accounts/sign-up', signUp);
  const { headers } = await visitor.signIn('signe.lyng@harkmoor.test', PASSWORD);
  await secure.close();
  expect(headers.getSetCookie()[0]).toMatch(/^harkmoor_refresh_443=.*; Secure/);
  expect(headers.get('strict-transport-security')).toBe('max-age=31536000; includeSubDomains');
});

test('should stay signed in beside another server on the same host', async () => {
  const [here, beside] = await Promise.all(
    ['http://harkmoor.test:3000', 'http://harkmoor.test:3100'].map((PUBLIC_URL) => makeApp({ PUBLIC_URL })),
  );
  // one browser, one host: it sends the cookies of both to each
  const jar: string[] = [];
  for (const { url } of [here!, beside!]) {
    const visitor = new Visitor(url);
    await visitor.post('/api/accounts/sign-up', signUp);
    await visitor.signIn('signe.lyng@harkmoor.test', PASSWORD);
    jar.push(visitor.cookie!);
  }
  expect(new Set(jar.map((cookie) => cookie.split('=')[0])).size).toBe(2);
  for (const { url } of [here!, beside!]) {
    const headers = { Cookie: jar.join('; ') };
    expect((await new Visitor(url).post('/api/accounts/refresh', {}, { headers })).status).toBe(200);
  }
  await Promise.all([here!.close(), beside!.close()]);
});

test('should refuse a confirming link after 48 hours and send a new one when asked', async () => {
  const visitor = new Visitor(server.url);
  const email = 'late@harkmoor.test';
  await visitor.post('/api/accounts/sign-up', { ...signUp, email });
  const token = linkTokenOf(await mail.mailTo(email), '/account/confirm');
  server.clock.pass(48 * 3_600_000);
  expect((await visitor.post('/api/accounts/confirm', { token })).body.code).toBe('link-spent');
  await visitor.signIn(email, PASSWORD);
  expect((await visitor.post('/api/accounts/confirm-again')).status).toBe(202);
  const fresh = linkTokenOf(await mail.mailTo(email, 2), '/account/confirm');
  expect((await visitor.post('/api/accounts/confirm', { token: fresh })).status).toBe(200);
});

test('should send a mail later where the mail server does not take it now', async () => {
  const visitor = new Visitor(server.url);
  const email = 'patient@harkmoor.test';
  mail.isClosed = true;
  await visitor.post('/api/accounts/sign-up', { ...signUp, email });
  await waitForTries(1);
  mail.isClosed = false;
  server.clock.pass(11_000);
  // any other mail wakes the queue
  await visitor.post('/api/accounts/sign-up', { ...signUp, email: 'next@harkmoor.test' });
  await mail.mailTo(email);
  await mail.mailTo('next@harkmoor.test');
  expect(mail.mails.filter(({ to }) => to === email)).toHaveLength(1);
});

test('should let no name write a header or markup into a mail', async () => {
  const visitor = new Visitor(server.url);
  const email = 'odd@harkmoor.test';
  const name = 'A\r\nBcc: x@y.test\n<b>B</b>';
  await visitor.post('/api/accounts/sign-up', { ...signUp, email, name });
  const caught = await mail.mailTo(email);
  expect(caught.parsed.headers.has('bcc')).toBe(false);
  expect(caught.parsed.subject).toBe('Confirm your mail address for Harkmoor');
  expect(String(caught.parsed.html)).not.toContain('<b>');
  expect(String(caught.parsed.html)).toContain('&lt;b&gt;B&lt;/b&gt;');
});

async function waitForTries(tries: number): Promise<void> {
  for (const until = Date.now() + 5000; Date.now() < until;) {
    const rows = await server.orm.em
      .getConnection()
      .execute<{ tries: number }[]>('select tries from outgoing_mail');
    if (rows.some((row) => row.tries >= tries)) return;
    await new Promise((resolve) => setTimeout(resolve, 20));
  }
  throw new Error('no mail was tried');
}
