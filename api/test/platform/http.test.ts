import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { makeApp, type TestApp } from '../app.js';
import { Visitor } from '../visitor.js';

let server: TestApp;
let visitor: Visitor;
let folder: string;
beforeAll(async () => {
  folder = mkdtempSync(join(tmpdir(), 'harkmoor-pwa-'));
  mkdirSync(join(folder, 'assets'));
  writeFileSync(join(folder, 'index.html'), '<!doctype html><title>Harkmoor</title>');
  writeFileSync(join(folder, 'sw.js'), '// worker');
  writeFileSync(join(folder, 'assets/field-1a2b.js'), 'export {};');
  server = await makeApp({ PWA_DIR: folder, REQUESTS_PER_MINUTE: '200' });
  visitor = new Visitor(server.url);
});
afterAll(async () => {
  await server.close();
  rmSync(folder, { recursive: true });
});

const signIn = { email: 'a@harkmoor.test', password: 'x', deviceId: 'phone001', deviceName: 'Phone' };
const SIGN_IN = '/api/accounts/sign-in';

test('should serve the application with hashed files for ever and everything else asked for again', async () => {
  const asset = await visitor.get('/assets/field-1a2b.js');
  expect([asset.status, asset.headers.get('cache-control')]).toEqual([
    200,
    'public, max-age=31536000, immutable',
  ]);
  for (const path of ['/', '/sw.js', '/field', '/account/confirm', '/logbook/some/record']) {
    const answer = await visitor.get(path);
    expect([path, answer.status, answer.headers.get('cache-control')]).toEqual([path, 200, 'no-cache']);
  }
  expect((await visitor.get('/account/reset')).text).toContain('<title>Harkmoor</title>');
});

test('should never answer the application where a script or an API route is missing', async () => {
  for (const path of ['/assets/gone-1a2b.js', '/api/gone', '/api', '/assets']) {
    const answer = await visitor.get(path);
    expect([path, answer.status, answer.body.code]).toEqual([path, 404, 'not-found']);
  }
  expect((await visitor.get('/api/gone')).headers.get('cache-control')).toBe('private, no-store');
});

// OWASP ASVS 5.0 V3.4.3 to V3.4.6
test('should allow scripts from this origin alone', async () => {
  const { headers } = await visitor.get('/');
  const policy = Object.fromEntries(
    headers
      .get('content-security-policy')!
      .split(';')
      .map((part) => {
        const [name, ...sources] = part.split(' ');
        return [name, sources.join(' ')];
      }),
  );
  expect(policy).toMatchObject({
    'default-src': "'self'",
    'script-src': "'self'",
    'connect-src': "'self'",
    'worker-src': "'self'",
    'object-src': "'none'",
    'base-uri': "'none'",
    'frame-ancestors': "'none'",
    'img-src': "'self' data: blob:",
  });
  expect(headers.get('x-content-type-options')).toBe('nosniff');
  expect(headers.get('referrer-policy')).toBe('no-referrer');
  expect(headers.get('permissions-policy')).toBe('geolocation=(self), camera=(self), microphone=(self)');
  expect(headers.get('x-powered-by')).toBeNull();
  expect(headers.get('access-control-allow-origin')).toBeNull();
  expect(headers.get('strict-transport-security')).toBeNull(); // plain http here
});

// OWASP ASVS 5.0 V3.5.1 to V3.5.3
test('should take a state change as JSON only, and from no other site', async () => {
  for (const contentType of ['text/plain', 'application/x-www-form-urlencoded', 'multipart/form-data']) {
    const { status, body } = await visitor.post(SIGN_IN, JSON.stringify(signIn), { contentType });
    expect([status, body.code]).toEqual([415, 'wrong-content-type']);
  }
  const crossSite = await visitor.post(SIGN_IN, signIn, { headers: { 'Sec-Fetch-Site': 'cross-site' } });
  expect([crossSite.status, crossSite.body.code]).toEqual([403, 'cross-site']);
  const bare = await fetch(`${server.url}/api/accounts/sign-out`, { method: 'POST' });
  expect(bare.status).toBe(415);
});

test('should read gzip, and stop a bomb at the limit without unpacking it', async () => {
  const small = await visitor.postGzip(SIGN_IN, Buffer.from(JSON.stringify(signIn)));
  expect(small.body.code).toBe('wrong-credentials');

  const bomb = Buffer.alloc(200 * 1024 * 1024, 0x20); // 200 KiB compressed
  const before = process.memoryUsage().rss;
  const { status, body } = await visitor.postGzip(SIGN_IN, bomb);
  expect([status, body.code]).toEqual([413, 'too-large']);
  expect(process.memoryUsage().rss - before).toBeLessThan(64 * 1024 * 1024);
});

test('should take a full round of 4 MiB and refuse a larger one', async () => {
  const padded = (bytes: number) => Buffer.from(JSON.stringify(signIn).padEnd(bytes, ' '));
  expect((await visitor.postGzip(SIGN_IN, padded(4 * 1024 * 1024))).status).toBe(401);
  expect((await visitor.postGzip(SIGN_IN, padded(4 * 1024 * 1024 + 65 * 1024))).status).toBe(413);
});

test('should say what is wrong with a body that cannot be read', async () => {
  for (const broken of ['{', 'null', '"text"', '{"a":1}}', '[1,']) {
    const { status, body } = await visitor.post(SIGN_IN, broken);
    expect([broken, status, body.code]).toEqual([broken, 400, 'invalid']);
    expect(body.message).not.toMatch(/position|token|at /i);
  }
  const encoding = { headers: { 'Content-Encoding': 'zstd' } };
  expect((await visitor.post(SIGN_IN, signIn, encoding)).status).toBe(415);
  const notGzip = await visitor.post(SIGN_IN, signIn, { headers: { 'Content-Encoding': 'gzip' } });
  expect([notGzip.status, notGzip.body.code]).toEqual([400, 'invalid']);
});

test('should name the request in every error, and keep the API out of caches', async () => {
  const { body, headers } = await visitor.get('/api/accounts/me');
  expect(body).toEqual({
    code: 'unauthenticated',
    message: 'Sign in first.',
    requestId: expect.stringMatching(/^[0-9a-f-]{36}$/) as string,
  });
  expect(headers.get('x-request-id')).toBe(body.requestId);
  expect(headers.get('cache-control')).toBe('private, no-store');
  expect(headers.get('etag')).toBeNull();
});

test('should compress what it answers', async () => {
  const answer = await fetch(`${server.url}/api/openapi.json`);
  expect(answer.headers.get('content-encoding')).toMatch(/gzip|br/);
  await answer.arrayBuffer();
});

test('should slow down a network that asks too often', async () => {
  const statuses: number[] = [];
  for (let n = 0; n < 201; n += 1) statuses.push((await visitor.get('/api/accounts/me')).status);
  expect(statuses.at(-1)).toBe(429);
  const refused = await visitor.get('/api/accounts/me');
  expect([refused.body.code, refused.headers.get('retry-after')]).toEqual(['too-many', '60']);
  expect((await visitor.get('/api/health')).status).toBe(200);
});
