import { createServer, type Server, type ServerResponse } from 'node:http';
import type { AddressInfo } from 'node:net';
import fc from 'fast-check';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { dropAccessToken, keepAccessToken } from '../platform/api/access-token';
import { backOffMs, listenForNotices, noticeIn, type Notice, type NoticeListening } from './notices';

const ACCOUNT = '0190a000-0000-7000-8000-00000000000a';
const CLUB = '0190a000-0000-7000-8000-00000000000c';
const page = Object.assign(new EventTarget(), { visibilityState: 'visible' });

let server: Server;
let streams: ServerResponse[];
let asked: (string | undefined)[];
let status: number;
let type: string;
let listening: NoticeListening | undefined;

/** A real server on loopback that keeps each stream open; the test writes into them. */
beforeEach(async () => {
  [streams, asked, status, type] = [[], [], 200, 'text/event-stream'];
  server = createServer((request, response) => {
    asked.push(request.headers.authorization);
    response.writeHead(status, { 'content-type': type });
    if (status === 200) {
      response.write('\n');
      streams.push(response);
    } else response.end();
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const { port } = server.address() as AddressInfo;
  const realFetch = globalThis.fetch;
  vi.stubGlobal('fetch', (path: string, init?: RequestInit) =>
    realFetch(`http://127.0.0.1:${port}${path}`, init),
  );
  vi.stubGlobal('document', page);
  vi.stubGlobal('navigator', {});
  show('visible');
  keepAccessToken(ACCOUNT, 'the-token');
});
afterEach(async () => {
  listening?.stop();
  dropAccessToken();
  vi.unstubAllGlobals();
  server.closeAllConnections();
  await new Promise((resolve) => server.close(resolve));
});

function show(state: 'visible' | 'hidden'): void {
  page.visibilityState = state;
  page.dispatchEvent(new Event('visibilitychange'));
}

function listen(): Notice[] {
  const heard: Notice[] = [];
  listening = listenForNotices(ACCOUNT, (notice) => heard.push(notice));
  return heard;
}

const until = (isDone: () => boolean) => vi.waitFor(() => expect(isDone()).toBe(true), { timeout: 8000 });
const event = (seq: number) => `event: seq\nid: 1\ndata: {"clubId":"${CLUB}","seq":${seq}}\n\n`;

it('should hear each notice, also one that arrives in pieces and among beats', async () => {
  const heard = listen();
  await until(() => streams.length === 1);
  expect(asked).toEqual(['Bearer the-token']);
  streams[0]!.write(event(4) + 'event: beat\ndata: {}\n\n' + event(5).slice(0, 20));
  await until(() => heard.length === 1);
  streams[0]!.write(event(5).slice(20));
  await until(() => heard.length === 2);
  expect(heard).toEqual([4, 5].map((seq) => ({ clubId: CLUB, seq })));
});

it('should open the stream again after the server has ended it', async () => {
  listen();
  await until(() => streams.length === 1);
  streams[0]!.end();
  await until(() => streams.length === 2);
});

it('should let go of the stream while hidden, and open it when shown again', async () => {
  listen();
  await until(() => streams.length === 1);
  const closed = new Promise((resolve) => streams[0]!.once('close', resolve));
  show('hidden');
  await closed;
  expect(streams).toHaveLength(1);
  await new Promise((resolve) => setTimeout(resolve, 50));
  show('visible');
  await until(() => streams.length === 2);
});

it('should open no stream while hidden from the start', async () => {
  show('hidden');
  listen();
  await new Promise((resolve) => setTimeout(resolve, 100));
  expect(asked).toEqual([]);
});

it('should hear nothing in the page of a portal', async () => {
  type = 'text/html';
  const heard = listen();
  await until(() => streams.length === 1);
  streams[0]!.end(event(7));
  await until(() => streams.length === 2); // it tries again
  expect(heard).toEqual([]);
});

it('should stop where the account is signed out', async () => {
  [status, type] = [401, 'application/json'];
  listen();
  await until(() => asked.length >= 2);
  const attempts = asked.length;
  await new Promise((resolve) => setTimeout(resolve, 2500));
  expect(asked).toHaveLength(attempts);
});

it('should go on trying where a portal asks for a sign-in of its own', async () => {
  [status, type] = [401, 'text/html'];
  listen();
  await until(() => asked.length >= 4);
});

it('should always wait between one second and five minutes, longer after more failures', () => {
  fc.assert(
    fc.property(fc.nat(1000), fc.double({ min: 0, max: 1, noNaN: true }), (failures, jitter) => {
      expect(backOffMs(failures, jitter)).toBeGreaterThanOrEqual(1000);
      expect(backOffMs(failures, jitter)).toBeLessThanOrEqual(300_000);
      expect(backOffMs(failures + 1, jitter)).toBeGreaterThanOrEqual(backOffMs(failures, jitter));
    }),
  );
});

it('should never take anything but a whole notice for one', () => {
  fc.assert(
    fc.property(fc.string(), fc.jsonValue(), (text, value) => {
      expect(noticeIn(text)).toBeNull();
      const notice = noticeIn(`event: seq\ndata: ${JSON.stringify(value)}`);
      if (notice) expect(notice).toEqual(value);
      expect(noticeIn(`event: seq\ndata: ${text}`)).toBeNull();
    }),
  );
});
