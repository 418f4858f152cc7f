import type { Link, LinkAnswer } from '@harkmoor/sync-model/device/ports';
import type { SyncRequest } from '@harkmoor/sync-model/protocol/messages';
import { asSyncAnswer } from '@harkmoor/sync-model/protocol/light-check';
import { accessTokenFor } from '../platform/api/access-token';
import { retryAfterMs } from '../platform/api/api-request';

const ROUND_TIMEOUT_MS = 60_000;
const COMPRESS_FROM_BYTES = 1024;

/**
 * The round over HTTP. Only a whole answer of ours counts; a portal's page, a cut body or a wrong type is
 * `unreachable`, never an acknowledgement.
 */
export function createHttpLink(accountId: string): Link {
  return {
    exchange: async (request) => {
      const first = await accessTokenFor(accountId);
      if (first.kind !== 'token') return withoutToken(first.kind);
      const answer = await exchangeOnce(request, first.token);
      if (answer.kind !== 'unauthorized') return answer;
      const second = await accessTokenFor(accountId, first.token);
      if (second.kind !== 'token') return withoutToken(second.kind);
      return exchangeOnce(request, second.token);
    },
  };
}

function withoutToken(kind: 'signed-out' | 'unreachable'): LinkAnswer {
  return { kind: kind === 'signed-out' ? 'unauthorized' : 'unreachable' };
}

async function exchangeOnce(request: SyncRequest, token: string): Promise<LinkAnswer> {
  try {
    const { body, encoding } = await compressed(JSON.stringify(request));
    const response = await fetch('/api/sync', {
      method: 'POST',
      headers: { 'content-type': 'application/json', authorization: `Bearer ${token}`, ...encoding },
      body,
      signal: AbortSignal.timeout(ROUND_TIMEOUT_MS),
    });
    return await readAnswer(response);
  } catch {
    return { kind: 'unreachable' };
  }
}

async function compressed(text: string): Promise<{ body: BodyInit; encoding: Record<string, string> }> {
  if (text.length < COMPRESS_FROM_BYTES || !('CompressionStream' in globalThis))
    return { body: text, encoding: {} };
  const stream = new Blob([text]).stream().pipeThrough(new CompressionStream('gzip'));
  return { body: await new Response(stream).blob(), encoding: { 'content-encoding': 'gzip' } };
}

async function readAnswer(response: Response): Promise<LinkAnswer> {
  if (response.status === 401) return { kind: 'unauthorized' };
  if (response.status === 429) return { kind: 'throttled', retryAfterMs: retryAfterMs(response) };
  if (!response.ok) return { kind: 'server-error' };
  if (!response.headers.get('content-type')?.includes('application/json')) return { kind: 'unreachable' };
  const answer = asSyncAnswer(await response.json());
  return answer ? { kind: 'answer', body: answer } : { kind: 'unreachable' };
}
