// @vitest-environment node
import http from 'node:http';
import type { AddressInfo } from 'node:net';
import { gunzipSync } from 'node:zlib';
import type { SyncRequest } from '@harkmoor/sync-model/protocol/messages';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { dropAccessToken, keepAccessToken } from '../platform/api/access-token';
import { createHttpLink } from './http-link';

const ACCOUNT = 'account-ida';
const ASKED: SyncRequest = { protocol: 1, deviceId: 'phone0001', sentAt: 1, clubs: [] };
const ANSWER = { protocol: 1, serverTime: 1, clubs: [], goneClubs: [] };
const JSON_TYPE = { 'content-type': 'application/json' };
const SHORT = { answerMs: 200, bodyMs: 200, bytesPerMs: 1000 };

let server: http.Server;
let port: number;
let answer: (request: http.IncomingMessage, response: http.ServerResponse, body: Buffer) => void;

beforeEach(async () => {
  vi.stubGlobal('navigator', {});
  vi.stubGlobal('performance', performance);
  keepAccessToken(ACCOUNT, 'the-token');
  server = http.createServer((request, response) => {
    const parts: Buffer[] = [];
    request.on('data', (part: Buffer) => parts.push(part));
    request.on('end', () => answer(request, response, Buffer.concat(parts)));
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  port = (server.address() as AddressInfo).port;
});
afterEach(() => {
  dropAccessToken();
  server.closeAllConnections();
  server.close();
  vi.unstubAllGlobals();
});

const toServer: typeof fetch = (input, init) => fetch(`http://127.0.0.1:${port}${String(input)}`, init);
const link = () => createHttpLink(ACCOUNT, toServer, SHORT);

describe('a round over a real connection', () => {
  it('should bring a whole answer of ours', async () => {
    answer = (_request, response) => response.writeHead(200, JSON_TYPE).end(JSON.stringify(ANSWER));
    expect(await link().exchange(ASKED)).toEqual({ kind: 'answer', body: ANSWER });
  });

  it.each([
    ['a portal’s page', 200, 'text/html', '<h1>Welcome to the harbour</h1>'],
    ['a portal that asks for its own sign-in', 401, 'text/html', '<h1>Sign in</h1>'],
    ['a cut body', 200, 'application/json', JSON.stringify(ANSWER).slice(0, -9)],
    ['JSON of somebody else', 200, 'application/json', '{"status":"ok"}'],
  ])('should take %s for no answer', async (_what, status, type, text) => {
    answer = (_request, response) => response.writeHead(status, { 'content-type': type }).end(text);
    expect(await link().exchange(ASKED)).toEqual({ kind: 'unreachable' });
  });

  it('should give up on a server that never answers and on an answer that stops half-way', async () => {
    answer = () => undefined;
    expect(await link().exchange(ASKED)).toEqual({ kind: 'unreachable' });
    answer = (_request, response) => void response.writeHead(200, JSON_TYPE).write('{"protocol":1,');
    expect(await link().exchange(ASKED)).toEqual({ kind: 'unreachable' });
  });

  it('should wait longer for many bytes than for few', async () => {
    const many = { ...ASKED, deviceId: 'x'.repeat(2_000_000) };
    vi.stubGlobal('CompressionStream', undefined);
    Reflect.deleteProperty(globalThis, 'CompressionStream');
    answer = (_request, response) =>
      void setTimeout(() => response.writeHead(200, JSON_TYPE).end(JSON.stringify(ANSWER)), 600);
    expect((await link().exchange(ASKED)).kind).toBe('unreachable');
    expect((await link().exchange(many)).kind).toBe('answer');
  });

  it('should send a large round compressed, and plain where the browser cannot', async () => {
    const large = { ...ASKED, deviceId: 'x'.repeat(5000) };
    const seen: [string | undefined, string][] = [];
    answer = (request, response, body) => {
      const encoding = request.headers['content-encoding'];
      seen.push([encoding, (encoding === 'gzip' ? gunzipSync(body) : body).toString()]);
      response.writeHead(200, JSON_TYPE).end(JSON.stringify(ANSWER));
    };
    await link().exchange(large);
    vi.stubGlobal('CompressionStream', undefined);
    Reflect.deleteProperty(globalThis, 'CompressionStream');
    await link().exchange(large);
    expect(seen).toEqual([
      ['gzip', JSON.stringify(large)],
      [undefined, JSON.stringify(large)],
    ]);
  });
});
