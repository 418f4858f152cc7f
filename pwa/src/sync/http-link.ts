import type { Link, LinkAnswer } from '@harkmoor/sync-model/device/ports';
import { asSyncAnswer } from '@harkmoor/sync-model/protocol/light-check';
import type { SyncRequest } from '@harkmoor/sync-model/protocol/messages';
import { accessTokenFor, isJson } from '../platform/api/access-token';
import { retryAfterMs } from '../platform/api/api-request';

/** How long a round may take: time for the server, and time for its bytes on a link of `bytesPerMs`. */
export type LinkPatience = {
  readonly answerMs: number;
  readonly bodyMs: number;
  readonly bytesPerMs: number;
};

/** A full round of 4 MiB that could not be compressed may need 17 minutes on a poor link; it is let go on. */
const PATIENCE: LinkPatience = { answerMs: 60_000, bodyMs: 120_000, bytesPerMs: 4 };
const COMPRESS_FROM_BYTES = 1024;

/**
 * The round over HTTP. Only a whole answer of ours counts; a portal's page, a cut body or a wrong type is
 * `unreachable`, never an acknowledgement.
 */
export function createHttpLink(
  accountId: string,
  send: typeof fetch = (input, init) => fetch(input, init),
  patience: LinkPatience = PATIENCE,
): Link {
  const once = (request: SyncRequest, token: string) => exchangeOnce(request, token, send, patience);
  return {
    exchange: async (request) => {
      const first = await accessTokenFor(accountId);
      if (first.kind !== 'token') return withoutToken(first.kind);
      const answer = await once(request, first.token);
      if (answer.kind !== 'unauthorized') return answer;
      const second = await accessTokenFor(accountId, first.token);
      if (second.kind !== 'token') return withoutToken(second.kind);
      return once(request, second.token);
    },
  };
}

function withoutToken(kind: 'signed-out' | 'unreachable'): LinkAnswer {
  return { kind: kind === 'signed-out' ? 'unauthorized' : 'unreachable' };
}

async function exchangeOnce(
  request: SyncRequest,
  token: string,
  send: typeof fetch,
  patience: LinkPatience,
): Promise<LinkAnswer> {
  const { body, bytes, encoding } = await compressed(JSON.stringify(request));
  const abort = new AbortController();
  let timer = setTimeout(() => abort.abort(), patience.answerMs + bytes / patience.bytesPerMs);
  try {
    const response = await send('/api/sync', {
      method: 'POST',
      headers: { 'content-type': 'application/json', authorization: `Bearer ${token}`, ...encoding },
      body,
      signal: abort.signal,
    });
    clearTimeout(timer);
    timer = setTimeout(() => abort.abort(), patience.bodyMs);
    return await readAnswer(response);
  } catch {
    return { kind: 'unreachable' };
  } finally {
    clearTimeout(timer);
  }
}

type Body = { body: BodyInit; bytes: number; encoding: Record<string, string> };

async function compressed(text: string): Promise<Body> {
  if (text.length < COMPRESS_FROM_BYTES || !('CompressionStream' in globalThis)) {
    return { body: text, bytes: text.length, encoding: {} };
  }
  const stream = new Blob([text]).stream().pipeThrough(new CompressionStream('gzip'));
  const body = await new Response(stream).blob();
  return { body, bytes: body.size, encoding: { 'content-encoding': 'gzip' } };
}

async function readAnswer(response: Response): Promise<LinkAnswer> {
  if (response.status === 401) return { kind: isJson(response) ? 'unauthorized' : 'unreachable' };
  if (response.status === 429) return { kind: 'throttled', retryAfterMs: retryAfterMs(response) };
  if (!response.ok) return { kind: 'server-error' };
  if (!isJson(response)) return { kind: 'unreachable' };
  const answer = asSyncAnswer(await response.json());
  return answer ? { kind: 'answer', body: answer } : { kind: 'unreachable' };
}
