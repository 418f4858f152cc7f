import { OldRows } from '../../src/accounts/old-rows.js';
import { makeApp, type TestApp } from '../app.js';
import { makeUnconfirmed } from '../people.js';

const DAY_MS = 24 * 3_600_000;

let server: TestApp;
beforeAll(async () => {
  server = await makeApp();
});
afterAll(() => server.close());

async function counts(): Promise<Record<string, number>> {
  const tables = [
    'attempt_count',
    'mail_token',
    'outgoing_mail',
    'device_session',
    'refresh_token',
    'account',
  ];
  const found: Record<string, number> = {};
  for (const table of tables) {
    const rows = await server.orm.em.getConnection().execute(`select 1 from ${table}`);
    found[table] = (rows as unknown[]).length;
  }
  return found;
}

test('should remove what is out of date and never what a device still needs', async () => {
  const { visitor, email } = await makeUnconfirmed(server, 'Long Away');
  await visitor.post('/api/accounts/refresh');
  await visitor.post('/api/accounts/refresh');
  await visitor.signIn(email, 'not the password', 'other001');
  const oldRows = server.app.get(OldRows);

  await oldRows.remove();
  expect(await counts()).toMatchObject({
    mail_token: 1,
    outgoing_mail: 1,
    device_session: 1,
    refresh_token: 3,
  });

  server.clock.pass(100 * DAY_MS);
  await oldRows.remove();
  // the first token is forgotten; the one in use and its successor are not
  const later = {
    attempt_count: 0,
    mail_token: 0,
    outgoing_mail: 0,
    device_session: 1,
    refresh_token: 2,
    account: 1,
  };
  expect(await counts()).toEqual(later);
  expect((await visitor.post('/api/accounts/refresh')).status).toBe(200);

  server.clock.pass(401 * DAY_MS);
  await oldRows.remove();
  expect(await counts()).toMatchObject({ device_session: 0, refresh_token: 0, account: 1 });
});
