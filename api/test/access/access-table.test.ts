import { errorAnswerSchema } from '../../src/platform/errors/refusal.js';
import { makeApp, type TestApp } from '../app.js';
import { MailCatcher } from '../mail-catcher.js';
import { foundClub, makePerson, type Person } from '../people.js';
import { routesOf } from '../routes.js';
import { Visitor } from '../visitor.js';
import { ACCESS_ROWS, VIEWERS, type AccessRow, type Viewer, type World } from './access-rows.js';

const mail = new MailCatcher();
let server: TestApp;
let world: World;
const people = new Map<Viewer, Person>();

beforeAll(async () => {
  const limits = {
    MAILS_PER_NETWORK_PER_HOUR: '1000',
    MAILS_PER_ADDRESS_PER_HOUR: '1000',
    SIGN_IN_TRIES: '1000',
  };
  server = await makeApp({ MAIL_URL: await mail.start(), ...limits });
  const admin = await makePerson(server, mail, 'The admin');
  people.set('admin', admin);
  const { clubId, code } = await foundClub(admin);
  for (const viewer of ['outsider', 'former', 'member', 'organizer'] as const) {
    const person = await makePerson(server, mail, `The ${viewer}`);
    people.set(viewer, person);
    if (viewer !== 'outsider') await person.visitor.post('/api/clubs/join', { code });
  }
  const target = await makePerson(server, mail, 'The target');
  await target.visitor.post('/api/clubs/join', { code });
  const organizerId = people.get('organizer')!.accountId;
  await admin.visitor.patch(`/api/clubs/${clubId}/members/${organizerId}`, { role: 'organizer' });
  await server.orm.em
    .getConnection()
    .execute('update membership set left_at = joined_at where club_id = ? and account_id = ?', [
      clubId,
      people.get('former')!.accountId,
    ]);
  const other = await foundClub(target, 'The other club');
  world = { clubId, targetId: target.accountId, otherCode: other.code, email: target.email };
});
afterAll(async () => {
  await server.close();
  await mail.stop();
});

/** A viewer with an access token alone, so that no cookie opens anything. */
function visitorFor(viewer: Viewer): Visitor {
  const visitor = new Visitor(server.url);
  visitor.accessToken = people.get(viewer)?.visitor.accessToken ?? null;
  return visitor;
}

test('should have a row for every route and no row for a route that is gone', () => {
  const routes = routesOf(server.app).map(({ name }) => name);
  expect(ACCESS_ROWS.map(({ route }) => route).sort()).toEqual(routes.sort());
});

test.each(ACCESS_ROWS.map((row) => [row.route, row] as const))(
  'should open %s to the right people',
  async (_, row) => {
    const statuses: number[] = [];
    for (const viewer of VIEWERS) statuses.push(await statusOf(row, viewer));
    expect(Object.fromEntries(VIEWERS.map((viewer, n) => [viewer, statuses[n]]))).toEqual(
      Object.fromEntries(VIEWERS.map((viewer, n) => [viewer, row.expected[n]])),
    );
  },
);

async function statusOf(row: AccessRow, viewer: Viewer): Promise<number> {
  const route = routesOf(server.app).find(({ name }) => name === row.route)!;
  const path = row.path?.(world) ?? route.path;
  const { status, body } = await visitorFor(viewer).send(route.method, path, row.body?.(world));
  // what is answered is what the route declares, and nothing beside it
  const schema = status < 400 ? route.answer?.schema : errorAnswerSchema;
  if (schema) expect(() => schema.parse(body)).not.toThrow();
  if (status < 400) expect(status).toBe(route.answer?.status);
  return status;
}

test('should close every route that is not declared public to people who are not signed in', async () => {
  for (const route of routesOf(server.app)) {
    const row = ACCESS_ROWS.find(({ route: name }) => name === route.name)!;
    const path = row.path?.(world) ?? route.path;
    const { status, body } = await new Visitor(server.url).send(route.method, path, row.body?.(world));
    if (!route.isPublic)
      expect([route.name, status, body.code]).toEqual([route.name, 401, 'unauthenticated']);
  }
});

test('should leave a club out of the round of anybody who is not in it', async () => {
  const row = ACCESS_ROWS.find(({ route }) => route === 'POST /api/sync')!;
  for (const viewer of ['outsider', 'former'] as const) {
    const { text, body } = await visitorFor(viewer).post('/api/sync', row.body!(world));
    expect(body.goneClubs).toEqual([world.clubId]);
    expect(text).not.toContain('Marram');
  }
});
