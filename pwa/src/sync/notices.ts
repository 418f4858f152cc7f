import { accessTokenFor } from '../platform/api/access-token';

/** A club, and where its feed stands at the server; what is new in it is fetched by a round. */
export type Notice = { clubId: string; seq: number };

export type NoticeListening = {
  /** Opens the stream unless it is open; called when the app comes back into view or the network returns. */
  resume(): void;
  stop(): void;
};

type StreamEnd = 'signed-out' | 'ended' | 'failed';

const PATH = '/api/sync/notices';
/** The server's beat comes every 25 s: a silence of more than two means that the connection is gone. */
const SILENCE_MS_MAX = 60_000;
const BACK_OFF_MS_MIN = 2_000;
const BACK_OFF_MS_MAX = 300_000;

/**
 * Listens for notices while the app is visible, and opens the stream again after each end, later after each
 * failure. It stops by itself where the account is signed out. Rounds come without it too, only later.
 */
export function listenForNotices(accountId: string, onNotice: (notice: Notice) => void): NoticeListening {
  let isStopped = false;
  let failures = 0;
  let open: AbortController | null = null;
  let timer: ReturnType<typeof setTimeout> | undefined;

  async function listen(): Promise<void> {
    clearTimeout(timer);
    if (open || isStopped || !isVisible()) return;
    const mine = new AbortController();
    open = mine;
    const end = await readStream(accountId, mine, (notice) => {
      failures = 0;
      if (!isStopped) onNotice(notice);
    });
    open = null;
    if (isStopped || end === 'signed-out') return;
    if (end === 'failed') failures += 1;
    timer = setTimeout(() => void listen(), backOffMs(failures, Math.random()));
  }

  const whenVisibilityChanges = () => {
    if (isVisible()) void listen();
    else open?.abort();
  };
  document.addEventListener('visibilitychange', whenVisibilityChanges);
  void listen();
  return {
    resume: () => void listen(),
    stop: () => {
      isStopped = true;
      clearTimeout(timer);
      open?.abort();
      document.removeEventListener('visibilitychange', whenVisibilityChanges);
    },
  };
}

/** Milliseconds until the stream is opened again; `jitter` is 0…1 and spreads phones that lost the same server. */
export function backOffMs(failures: number, jitter: number): number {
  return Math.min(BACK_OFF_MS_MAX, BACK_OFF_MS_MIN * 2 ** Math.min(failures, 10)) * (0.5 + jitter / 2);
}

function isVisible(): boolean {
  return document.visibilityState === 'visible';
}

async function readStream(
  accountId: string,
  abort: AbortController,
  onNotice: (notice: Notice) => void,
): Promise<StreamEnd> {
  const watch = watchSilence(abort);
  try {
    const response = await openStream(accountId, abort.signal);
    if (response === 'signed-out') return 'signed-out';
    if (!isEventStream(response)) return 'failed';
    const reader = response.body!.pipeThrough(new TextDecoderStream()).getReader();
    let text = '';
    for (;;) {
      const { done, value } = await reader.read();
      if (done) return 'ended';
      watch.heard();
      const blocks = (text + value).split('\n\n');
      text = blocks.pop()!;
      for (const block of blocks) {
        const notice = noticeIn(block);
        if (notice) onNotice(notice);
      }
    }
  } catch {
    return 'failed'; // no network, or given up on purpose: the next stream tells where each club stands
  } finally {
    watch.stop();
  }
}

/** A token that was refused is renewed once, as in a round. */
async function openStream(accountId: string, signal: AbortSignal): Promise<Response | 'signed-out' | null> {
  let refused: string | undefined;
  for (let attempt = 1; attempt <= 2; attempt += 1) {
    const token = await accessTokenFor(accountId, refused);
    if (token.kind !== 'token') return token.kind === 'signed-out' ? 'signed-out' : null;
    const headers = { accept: 'text/event-stream', authorization: `Bearer ${token.token}` };
    const response = await fetch(PATH, { headers, signal, cache: 'no-store' });
    if (response.status !== 401) return response;
    refused = token.token;
  }
  return 'signed-out';
}

/** A portal's page or an error of a proxy is no stream of ours. */
function isEventStream(response: Response | null): response is Response {
  return (
    response?.ok === true &&
    response.body !== null &&
    response.headers.get('content-type')?.startsWith('text/event-stream') === true
  );
}

/** The notice in one event of the stream; null for beats and for anything else. */
export function noticeIn(block: string): Notice | null {
  if (!/^event: ?seq$/m.test(block)) return null;
  const data = /^data: ?(.*)$/m.exec(block)?.[1];
  if (data === undefined) return null;
  try {
    const { clubId, seq } = JSON.parse(data) as Partial<Notice>;
    return typeof clubId === 'string' && typeof seq === 'number' ? { clubId, seq } : null;
  } catch {
    return null;
  }
}

function watchSilence(abort: AbortController): { heard(): void; stop(): void } {
  const start = () => setTimeout(() => abort.abort(), SILENCE_MS_MAX);
  let timer = start();
  return {
    heard: () => {
      clearTimeout(timer);
      timer = start();
    },
    stop: () => clearTimeout(timer),
  };
}
