import { generateKeyPairSync } from 'node:crypto';
import { JwtService, type JwtSignOptions } from '@nestjs/jwt';
import { Secrets } from '../../src/platform/secrets/secrets.js';
import { makeApp, type TestApp } from '../app.js';
import { makeUnconfirmed, type Person } from '../people.js';
import { Visitor } from '../visitor.js';

let server: TestApp;
let person: Person;
let key: Buffer;
let sessionId: string;
beforeAll(async () => {
  server = await makeApp();
  person = await makeUnconfirmed(server, 'Tove Klit');
  key = server.app.get(Secrets).key('access-token');
  sessionId = (payloadOf(person.visitor.accessToken!) as { sid: string }).sid;
});
afterAll(() => server.close());

const RIGHT: JwtSignOptions = {
  algorithm: 'HS256',
  audience: 'harkmoor-api',
  issuer: 'harkmoor',
  expiresIn: 900,
  header: { alg: 'HS256', typ: 'at+jwt' },
};

function sign(options: JwtSignOptions = {}, claims: object = {}, signingKey: Buffer | string = key): string {
  const payload = { sub: person.accountId, sid: sessionId, ...claims };
  return new JwtService().sign(payload, { ...RIGHT, ...options, secret: signingKey });
}

async function statusWith(accessToken: string): Promise<number> {
  const visitor = new Visitor(server.url);
  visitor.accessToken = accessToken;
  return (await visitor.get('/api/accounts/me')).status;
}

function payloadOf(token: string): object {
  return JSON.parse(Buffer.from(token.split('.')[1]!, 'base64url').toString()) as object;
}

const encoded = (value: object) => Buffer.from(JSON.stringify(value)).toString('base64url');

test('should take a token that is right in everything', async () => {
  expect(await statusWith(sign())).toBe(200);
  expect(await statusWith(person.visitor.accessToken!)).toBe(200);
});

// OWASP ASVS 5.0 V9.1.1 to V9.2.3
test('should refuse a token without a signature, by any spelling of none', async () => {
  for (const alg of ['none', 'None', 'NONE', '']) {
    const [, payload] = sign().split('.');
    expect(await statusWith(`${encoded({ alg, typ: 'at+jwt' })}.${payload}.`)).toBe(401);
  }
});

test('should refuse a token signed in another way, even with the same key', async () => {
  expect(await statusWith(sign({ algorithm: 'HS512', header: { alg: 'HS512', typ: 'at+jwt' } }))).toBe(401);
  const { privateKey } = generateKeyPairSync('rsa', { modulusLength: 2048 });
  const rsa = new JwtService().sign(
    { sub: person.accountId, sid: sessionId },
    {
      ...RIGHT,
      algorithm: 'RS256',
      header: { alg: 'RS256', typ: 'at+jwt' },
      privateKey: privateKey.export({ type: 'pkcs8', format: 'pem' }),
    },
  );
  expect(await statusWith(rsa)).toBe(401);
});

test('should refuse a token that brings its own key', async () => {
  const header = {
    alg: 'HS256',
    typ: 'at+jwt',
    jwk: { kty: 'oct', k: 'AAAA' },
    jku: 'http://127.0.0.1:9/k',
  } as const;
  expect(await statusWith(sign({ header: header as never }, {}, 'AAAA'))).toBe(401);
});

test('should refuse a token for another audience, issuer, or use', async () => {
  expect(await statusWith(sign({ audience: 'somebody-else' }))).toBe(401);
  expect(await statusWith(sign({ issuer: 'somebody-else' }))).toBe(401);
  expect(await statusWith(sign({ header: { alg: 'HS256', typ: 'JWT' } }))).toBe(401);
  expect(await statusWith(person.visitor.cookie!.split('=')[1]!)).toBe(401);
});

test('should refuse a token that is not valid yet', async () => {
  expect(await statusWith(sign({ notBefore: 600 }))).toBe(401);
});

test('should refuse an altered token', async () => {
  const [header, payload, signature] = sign().split('.');
  const other = encoded({ ...payloadOf(sign()), sub: '01a22fe4-a845-7498-a81b-56378b1c63d0' });
  expect(await statusWith(`${header}.${other}.${signature}`)).toBe(401);
  expect(await statusWith(`${header}.${payload}.${signature!.split('').reverse().join('')}`)).toBe(401);
  expect(await statusWith(sign({}, {}, 'another key'))).toBe(401);
});

test('should refuse a token of a session that never was, or was somebody else’s', async () => {
  expect(await statusWith(sign({}, { sid: '01a22fe4-a845-7498-a81b-56378b1c63d0' }))).toBe(401);
  const other = await makeUnconfirmed(server, 'Ebbe Vang');
  expect(await statusWith(sign({}, { sub: other.accountId }))).toBe(401);
});

test('should refuse a token after fifteen minutes', async () => {
  const token = sign();
  server.clock.pass(14 * 60_000);
  expect(await statusWith(token)).toBe(200);
  server.clock.pass(61_000);
  expect(await statusWith(token)).toBe(401);
});
