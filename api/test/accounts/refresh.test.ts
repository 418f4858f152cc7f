import fc from 'fast-check';
import { makeApp, type TestApp } from '../app.js';
import { MailCatcher } from '../mail-catcher.js';
import { makeUnconfirmed, PASSWORD, type Person } from '../people.js';
import { Visitor } from '../visitor.js';

const mail = new MailCatcher();
let server: TestApp;
let person: Person;
beforeAll(async () => {
  server = await makeApp({ MAIL_URL: await mail.start(), SIGN_IN_TRIES: '1000' });
  person = await makeUnconfirmed(server, 'Aage Holm');
});
afterAll(async () => {
  await server.close();
  await mail.stop();
});

/** A device that is signed in, with its first refresh cookie. */
async function signedIn(deviceId: string): Promise<Visitor> {
  const visitor = new Visitor(server.url);
  await visitor.signIn(person.email, PASSWORD, deviceId);
  return visitor;
}

/** A refresh with a given cookie; what the device would hold after it, or null where it was sent away. */
async function refreshWith(cookie: string): Promise<string | null> {
  const visitor = new Visitor(server.url);
  visitor.cookie = cookie;
  const { status } = await visitor.post('/api/accounts/refresh');
  return status === 200 ? visitor.cookie : null;
}

test('should give the same successor a hundred times while its answers are lost', async () => {
  const { cookie } = await signedIn('lost0001');
  const successors = new Set<string | null>();
  for (let time = 0; time < 100; time += 1) successors.add(await refreshWith(cookie!));
  expect(successors.size).toBe(1);
  const [successor] = successors;
  expect(successor).not.toBeNull();
  expect(await refreshWith(successor!)).not.toBeNull();
});

test('should end the session once an old token comes after its successor was used', async () => {
  const visitor = await signedIn('reuse001');
  const first = visitor.cookie!;
  const second = (await refreshWith(first))!;
  const third = (await refreshWith(second))!;
  expect(await refreshWith(first)).toBeNull();
  expect(await refreshWith(third)).toBeNull();
  expect((await visitor.get('/api/accounts/me')).status).toBe(401);
});

test('should leave the other devices of the person signed in', async () => {
  const other = await signedIn('other001');
  const stolen = await signedIn('stolen01');
  const first = stolen.cookie!;
  await refreshWith((await refreshWith(first))!);
  await refreshWith(first);
  expect((await other.get('/api/accounts/me')).status).toBe(200);
  expect((await other.post('/api/accounts/refresh')).status).toBe(200);
});

test('should take two refreshes at once with one token for one', async () => {
  const { cookie } = await signedIn('twotabs1');
  const both = await Promise.all([refreshWith(cookie!), refreshWith(cookie!)]);
  expect(both[0]).toBe(both[1]);
  expect(await refreshWith(both[0]!)).not.toBeNull();
});

test('should always keep a device that uses its newest token, and never one whose spent token is used', async () => {
  await fc.assert(
    fc.asyncProperty(fc.array(fc.boolean(), { maxLength: 6 }), fc.nat(5), async (answersArrive, copied) => {
      const given = [(await signedIn('propert1')).cookie!];
      for (const arrives of answersArrive) {
        const next = await refreshWith(given.at(-1)!);
        expect(next).not.toBeNull();
        if (arrives) given.push(next!);
      }
      // the newest token may be tried again; so may the one before it while its successor was never used
      const isSpent = copied < given.length - 1;
      if (!isSpent) return;
      await refreshWith(given.at(-1)!);
      expect(await refreshWith(given[copied]!)).toBeNull();
      expect(await refreshWith(given.at(-1)!)).toBeNull();
    }),
    { numRuns: 8 },
  );
});

test('should keep no token in the database, only hashes', async () => {
  const visitor = await signedIn('hashes01');
  const token = visitor.cookie!.split('=')[1]!;
  const connection = server.orm.em.getConnection();
  const rows = [
    ...(await connection.execute<object[]>('select * from device_session')),
    ...(await connection.execute<object[]>('select * from refresh_token')),
  ];
  expect(rows.length).toBeGreaterThan(2);
  expect(JSON.stringify(rows)).not.toContain(token);
});

test('should refuse invented and missing tokens, and take the cookie away', async () => {
  expect(await refreshWith(`harkmoor_refresh_80=${'A'.repeat(43)}`)).toBeNull();
  const { status, body, headers } = await new Visitor(server.url).post('/api/accounts/refresh');
  expect([status, body.code]).toEqual([401, 'unauthenticated']);
  expect(headers.getSetCookie()[0]).toMatch(
    /^harkmoor_refresh_80=; Path=\/api\/accounts; Expires=Thu, 01 Jan 1970/,
  );
});

test('should let a device come back after a year away, and not after two', async () => {
  const visitor = await signedIn('yearaway');
  server.clock.pass(365 * 24 * 3_600_000);
  expect((await visitor.post('/api/accounts/refresh')).status).toBe(200);
  server.clock.pass(2 * 365 * 24 * 3_600_000);
  expect((await visitor.post('/api/accounts/refresh')).status).toBe(401);
});

test('should end the earlier session when a device signs in again', async () => {
  const visitor = await signedIn('again001');
  const { accessToken } = visitor;
  await visitor.signIn(person.email, PASSWORD, 'again001');
  expect((await visitor.get('/api/accounts/me')).status).toBe(200);
  visitor.accessToken = accessToken;
  expect((await visitor.get('/api/accounts/me')).status).toBe(401);
});
