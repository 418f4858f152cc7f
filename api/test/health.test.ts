import { makeApp, type TestApp } from './app.js';

let server: TestApp;
beforeAll(async () => {
  server = await makeApp();
});
afterAll(() => server.close());

test('should answer ready once the database is migrated', async () => {
  const answer = await fetch(`${server.url}/api/health`);
  expect(answer.status).toBe(200);
  expect(await answer.json()).toEqual({ status: 'ready' });
  expect(answer.headers.get('cache-control')).toBe('private, no-store');
});

test('should say not ready while a migration is missing', async () => {
  const bare = await makeApp();
  await bare.orm.em.getConnection().execute('delete from mikro_orm_migrations');
  const answer = await fetch(`${bare.url}/api/health`);
  expect(answer.status).toBe(503);
  expect(await answer.json()).toMatchObject({ code: 'not-ready' });
  await bare.close();
});
