import type { OpenAPIObject } from '@nestjs/swagger';
import { makeApp, type TestApp } from '../app.js';
import { routesOf } from '../routes.js';
import { Visitor } from '../visitor.js';

type Layer = { route?: { path: string; methods: Record<string, boolean> } };

let server: TestApp;
let document: OpenAPIObject;
beforeAll(async () => {
  server = await makeApp();
  document = (await new Visitor(server.url).get('/api/openapi.json')).body as unknown as OpenAPIObject;
});
afterAll(() => server.close());

const described = () =>
  Object.entries(document.paths).flatMap(([path, methods]) =>
    Object.keys(methods).map((method) => `${method.toUpperCase()} ${path.replace(/\{(\w+)\}/g, ':$1')}`),
  );

test('should describe exactly the routes that are served', () => {
  const { router } = server.app.getHttpAdapter().getInstance() as { router: { stack: Layer[] } };
  const served = router.stack.flatMap(({ route }) =>
    // a layer for all methods is Nest's own middleware, not a route
    route && Object.keys(route.methods).length < 5
      ? Object.keys(route.methods).map((method) => `${method.toUpperCase()} ${route.path}`)
      : [],
  );
  const ownPages = /^(GET|HEAD) \/?api\/(docs|openapi)|^GET \/\{\*path\}$/;
  expect(described().sort()).toEqual(served.filter((name) => !ownPages.test(name)).sort());
  expect(described().sort()).toEqual(
    routesOf(server.app)
      .map(({ name }) => name)
      .sort(),
  );
});

test('should describe the body and the answer of each route from its schemas', () => {
  for (const route of routesOf(server.app)) {
    const path = route.path.replace(/:(\w+)/g, '{$1}');
    const method = route.method.toLowerCase() as 'get' | 'post' | 'patch';
    const operation = document.paths[path]![method]!;
    if (route.method !== 'GET')
      expect([route.name, operation.requestBody]).not.toEqual([route.name, undefined]);
    expect([route.name, route.answer]).not.toEqual([route.name, undefined]);
    expect(Object.keys(operation.responses)).toEqual(
      expect.arrayContaining([String(route.answer!.status), 'default']),
    );
  }
});

test('should show the description as a page that needs no inline script', async () => {
  const page = await new Visitor(server.url).get('/api/docs');
  expect(page.status).toBe(200);
  expect(page.text).not.toMatch(/<script(?![^>]*\bsrc=)[^>]*>\s*\S/);
});
