import { makeApp, type TestApp } from '../app.js';
import { linkTokenOf, MailCatcher } from '../mail-catcher.js';
import { makePerson, PASSWORD } from '../people.js';
import { Visitor, type Answer } from '../visitor.js';

const mail = new MailCatcher();
let server: TestApp;
beforeAll(async () => {
  server = await makeApp({ MAIL_URL: await mail.start(), SIGN_IN_TRIES: '1000' });
  await makePerson(server, mail, 'Known Person');
});
afterAll(async () => {
  await server.close();
  await mail.stop();
});

const KNOWN = 'known.person@harkmoor.test';

/** All of an answer but what differs by nature: the request's id and the time of day. */
function comparable({ status, headers, body }: Answer): object {
  const kept = [...headers].filter(([name]) => !['x-request-id', 'date', 'set-cookie'].includes(name));
  const { requestId: _, ...rest } = body;
  return { status, headers: kept, body: rest };
}

async function timed(work: () => Promise<Answer>): Promise<{ answer: Answer; tookMs: number }> {
  const startedAt = performance.now();
  const answer = await work();
  return { answer, tookMs: performance.now() - startedAt };
}

test('should answer a sign-up alike whether the address is known, and tell the owner', async () => {
  const visitor = new Visitor(server.url);
  const post = (email: string) =>
    timed(() =>
      visitor.post('/api/accounts/sign-up', { name: 'Anybody', email, password: 'another password' }),
    );
  const known = await post(KNOWN);
  const unknown = await post('new.person@harkmoor.test');
  expect(comparable(known.answer)).toEqual(comparable(unknown.answer));
  // both wait for the same least time, which is longer than the work differs
  expect(Math.min(known.tookMs, unknown.tookMs)).toBeGreaterThanOrEqual(245);

  const { parsed } = await mail.mailTo(KNOWN, 2);
  expect(parsed.subject).toBe('You have a Harkmoor account already');
  expect((await visitor.signIn(KNOWN, PASSWORD)).status).toBe(200);
});

test('should answer a reset request alike whether the address is known', async () => {
  const visitor = new Visitor(server.url);
  const post = (email: string) => timed(() => visitor.post('/api/accounts/reset-request', { email }));
  const known = await post(KNOWN);
  const unknown = await post('nobody@harkmoor.test');
  expect(comparable(known.answer)).toEqual(comparable(unknown.answer));
  expect(Math.min(known.tookMs, unknown.tookMs)).toBeGreaterThanOrEqual(245);
  await mail.mailTo(KNOWN, 3);
  expect(mail.mails.filter(({ to }) => to === 'nobody@harkmoor.test')).toEqual([]);
});

test('should answer a failed sign-in alike whether the address is known', async () => {
  const visitor = new Visitor(server.url);
  const known = await visitor.signIn(KNOWN, 'not the password');
  const unknown = await visitor.signIn('nobody@harkmoor.test', 'not the password');
  expect([known.status, known.body.code]).toEqual([401, 'wrong-credentials']);
  expect(comparable(known)).toEqual(comparable(unknown));
});

test('should hand an address back to its owner where somebody else signed up with it', async () => {
  const visitor = new Visitor(server.url);
  const email = 'taken.early@harkmoor.test';
  await visitor.post('/api/accounts/sign-up', {
    name: 'Not The Owner',
    email,
    password: 'a stranger chose this',
  });
  await visitor.signIn(email, 'a stranger chose this');
  expect((await visitor.get('/api/accounts/me')).status).toBe(200);

  await new Visitor(server.url).post('/api/accounts/sign-up', { name: 'Owner', email, password: PASSWORD });
  const token = linkTokenOf(await mail.mailTo(email, 2), '/account/reset');
  expect((await visitor.post('/api/accounts/reset', { token, password: PASSWORD })).status).toBe(200);
  expect((await visitor.get('/api/accounts/me')).status).toBe(401);
  expect((await visitor.signIn(email, 'a stranger chose this')).status).toBe(401);
  expect((await visitor.signIn(email, PASSWORD)).body.account).toMatchObject({ confirmed: true });
});

test('should make one account where two sign-ups with one address cross', async () => {
  const email = 'crossed@harkmoor.test';
  const visitor = new Visitor(server.url);
  const both = await Promise.all(
    [1, 2, 3].map(() =>
      visitor.post('/api/accounts/sign-up', { name: 'Crossed', email, password: PASSWORD }),
    ),
  );
  expect(both.map(({ status }) => status)).toEqual([202, 202, 202]);
  const rows = await server.orm.em.getConnection().execute('select 1 from account where email = ?', [email]);
  expect(rows).toHaveLength(1);
});
