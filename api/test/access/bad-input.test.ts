import type { z } from 'zod';
import { errorAnswerSchema } from '../../src/platform/errors/refusal.js';
import { makeApp, type TestApp } from '../app.js';
import { MailCatcher } from '../mail-catcher.js';
import { foundClub, makePerson, type Person } from '../people.js';
import { routesOf, type Route } from '../routes.js';
import { ACCESS_ROWS, type World } from './access-rows.js';
import { misfitsOf } from './misfits.js';

const mail = new MailCatcher();
let server: TestApp;
let person: Person;
let world: World;
beforeAll(async () => {
  const limits = { MAILS_PER_NETWORK_PER_HOUR: '100000', SIGN_IN_TRIES: '100000' };
  server = await makeApp({ MAIL_URL: await mail.start(), ...limits });
  person = await makePerson(server, mail, 'Careless Person');
  const { clubId } = await foundClub(person);
  const { code } = await foundClub(person, 'Other');
  world = { clubId, targetId: person.accountId, otherCode: code, email: person.email };
});
afterAll(async () => {
  await server.close();
  await mail.stop();
});

const rowOf = ({ name }: Route) => ACCESS_ROWS.find(({ route }) => route === name)!;

test('should refuse every misfit of every body, say where it lies, and save nothing', async () => {
  const before = await everything();
  let refused = 0;
  for (const route of routesOf(server.app)) {
    if (!route.body) continue;
    const row = rowOf(route);
    const path = row.path?.(world) ?? route.path;
    for (const { what, at, value } of misfitsOf(route.body, row.body!(world))) {
      if (route.body.safeParse(value).success) continue; // some schemas have room for it
      const answer = await person.visitor.send(route.method, path, JSON.stringify(value));
      const label = `${route.name}: ${what}`;
      expect([label, answer.status, answer.body.code]).toEqual([label, 400, 'invalid']);
      const { where = [], message } = errorAnswerSchema.parse(answer.body);
      expect(message).not.toMatch(/\bat .+:\d+|node_modules|\.ts\b|\.js\b/);
      // the reader of JSON itself refuses what is no object or list
      if (typeof value === 'object' && value !== null) {
        const places = where.map((misfit) => misfit.path);
        expect([label, places.some((place) => place.startsWith(at) || at.startsWith(place))]).toEqual([
          label,
          true,
        ]);
      }
      refused += 1;
    }
  }
  expect(refused).toBeGreaterThan(150);
  expect(await everything()).toEqual(before);
});

test('should never fall over strange input that the schemas have room for', async () => {
  for (const route of routesOf(server.app)) {
    if (!route.body || route.path.endsWith('/sign-out')) continue;
    const path = rowOf(route).path?.(world) ?? route.path;
    for (const { what, value } of misfitsOf(route.body, rowOf(route).body!(world))) {
      if (!route.body.safeParse(value).success) continue;
      const { status } = await person.visitor.send(route.method, path, JSON.stringify(value));
      expect([route.name, what, status < 500]).toEqual([route.name, what, true]);
    }
  }
});

test('should refuse every misfit in a path', async () => {
  const odd = [
    'x',
    '0',
    '%00',
    '..%2f..%2f',
    '%3Cscript%3E',
    "'%20or%201=1--",
    'a'.repeat(3000),
    '%F0%9F%8C%8A',
  ];
  for (const route of routesOf(server.app)) {
    for (const name of Object.keys(route.params?.shape ?? {})) {
      for (const value of odd) {
        const right = rowOf(route).path!(world);
        const place = route.path.split('/').indexOf(`:${name}`);
        const path = right.split('/').with(place, value).join('/');
        const { status, body, text } = await person.visitor.send(
          route.method,
          path,
          rowOf(route).body?.(world),
        );
        expect([path.slice(0, 200), status, body.code]).toEqual([path.slice(0, 200), 400, 'invalid']);
        expect(text).not.toContain('<script');
      }
    }
  }
});

test('should declare the body of every route that changes something', () => {
  for (const { name, method, body } of routesOf(server.app)) {
    if (method !== 'GET') expect([name, isZod(body)]).toEqual([name, true]);
  }
});

function isZod(schema: unknown): schema is z.ZodType {
  return typeof schema === 'object' && schema !== null && 'safeParse' in schema;
}

/** All rows of all tables as text, but for counts of tries. */
async function everything(): Promise<Record<string, string>> {
  const connection = server.orm.em.getConnection();
  const tables = await connection.execute<{ name: string }[]>(
    `select table_name as name from information_schema.tables where table_schema = 'public' and table_type = 'BASE TABLE'`,
  );
  const found: Record<string, string> = {};
  for (const { name } of tables) {
    if (name === 'attempt_count' || name === 'outgoing_mail') continue;
    const [row] = await connection.execute<{ all: string | null }[]>(
      `select md5(string_agg(t::text, '|' order by t::text)) as "all" from "${name}" t`,
    );
    found[name] = row!.all ?? '';
  }
  return found;
}
