// @vitest-environment jsdom
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { dropAccessToken, keepAccessToken } from '../platform/api/access-token';
import type { OpenLog } from '../store/open-log';
import { openTestAccountLog, TEST_IDS } from '../store/test-log';
import { followNotices } from './follow-notices';

let log: OpenLog;
let stream: ReadableStreamDefaultController<Uint8Array> | undefined;
let isReady: boolean;
let rounds: number;
let notices: ReturnType<typeof followNotices>;

beforeEach(async () => {
  log = await openTestAccountLog();
  await log.database.clubs.update(TEST_IDS.club, { cursor: 7 });
  vi.stubGlobal('fetch', async () => {
    const body = new ReadableStream<Uint8Array>({ start: (controller) => void (stream = controller) });
    return new Response(body, { headers: { 'content-type': 'text/event-stream' } });
  });
  keepAccessToken(TEST_IDS.account, 'the-token');
  [isReady, rounds, stream] = [true, 0, undefined];
  notices = followNotices(
    log,
    TEST_IDS.account,
    () => isReady,
    () => void (rounds += 1),
  );
  await vi.waitFor(() => expect(stream).toBeDefined());
});
afterEach(() => {
  notices.stop();
  dropAccessToken();
  log.database.close();
  vi.unstubAllGlobals();
});

function tell(clubId: string, seq: number): void {
  const event = `event: seq\ndata: ${JSON.stringify({ clubId, seq })}\n\n`;
  stream!.enqueue(new TextEncoder().encode(event));
}
const settled = () => new Promise((resolve) => setTimeout(resolve, 50));

it('should ask for a round where the server has more of a club, and only there', async () => {
  tell(TEST_IDS.club, 7);
  await settled();
  expect(rounds).toBe(0);
  tell(TEST_IDS.club, 8);
  await vi.waitFor(() => expect(rounds).toBe(1));
});

it('should ask for a round where the phone does not know the club yet', async () => {
  tell('0190a000-0000-7000-8000-0000000000ff', 1);
  await vi.waitFor(() => expect(rounds).toBe(1));
});

it('should ask for none after a round that has fetched what it was told of meanwhile', async () => {
  isReady = false;
  tell(TEST_IDS.club, 9);
  await settled();
  await log.database.clubs.update(TEST_IDS.club, { cursor: 9 });
  isReady = true;
  notices.follow();
  await settled();
  expect(rounds).toBe(0);
});

it('should ask for one after a round that had begun before the news', async () => {
  isReady = false;
  tell(TEST_IDS.club, 9);
  await settled();
  expect(rounds).toBe(0);
  isReady = true;
  notices.follow();
  await vi.waitFor(() => expect(rounds).toBe(1));
});
