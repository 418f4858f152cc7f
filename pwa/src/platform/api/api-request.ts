import { accessTokenFor } from './access-token';

/** What came of a request: refusals and broken links are values, so that each screen says what to do. */
export type ApiAnswer<T> =
  | { kind: 'ok'; body: T }
  | { kind: 'refused'; status: number; code: string; message: string; fields: Record<string, string> }
  | { kind: 'signed-out' }
  | { kind: 'throttled'; retryAfterMs: number }
  | { kind: 'unreachable' };

export type ApiCall = {
  method?: 'GET' | 'POST' | 'PATCH' | 'PUT' | 'DELETE';
  body?: unknown;
  /** The account in whose name it is asked; none for sign-up, sign-in and reset. */
  accountId?: string;
};

const TIMEOUT_MS = 20_000;
const RETRY_AFTER_MS_DEFAULT = 30_000;

/** Asks the API at `path` (beginning with /api/). Renews an old token once. Never throws for the network's sake. */
export async function apiRequest<T>(path: string, call: ApiCall = {}): Promise<ApiAnswer<T>> {
  if (call.accountId === undefined) return readAnswer<T>(await send(path, call, undefined));
  const first = await accessTokenFor(call.accountId);
  if (first.kind !== 'token') return first;
  const response = await send(path, call, first.token);
  if (response?.status !== 401) return readAnswer<T>(response);
  const second = await accessTokenFor(call.accountId, first.token);
  if (second.kind !== 'token') return second;
  return readAnswer<T>(await send(path, call, second.token));
}

async function send(path: string, call: ApiCall, token: string | undefined): Promise<Response | null> {
  const headers: Record<string, string> = { accept: 'application/json' };
  if (call.body !== undefined) headers['content-type'] = 'application/json';
  if (token) headers.authorization = `Bearer ${token}`;
  try {
    return await fetch(path, {
      method: call.method ?? 'GET',
      headers,
      body: call.body === undefined ? undefined : JSON.stringify(call.body),
      signal: AbortSignal.timeout(TIMEOUT_MS),
    });
  } catch {
    return null;
  }
}

async function readAnswer<T>(response: Response | null): Promise<ApiAnswer<T>> {
  if (!response || response.status >= 500) return { kind: 'unreachable' };
  if (response.status === 429) return { kind: 'throttled', retryAfterMs: retryAfterMs(response) };
  if (response.status === 204) return { kind: 'ok', body: undefined as T };
  const body = await readJson(response);
  if (body === undefined) return { kind: 'unreachable' };
  if (response.ok) return { kind: 'ok', body: body as T };
  const told = body as { code?: string; message?: string; where?: { path: string; message: string }[] };
  if (response.status === 401 && told.code !== 'wrong-credentials') return { kind: 'signed-out' };
  return {
    kind: 'refused',
    status: response.status,
    code: told.code ?? 'refused',
    message: told.message ?? 'The server did not take this.',
    fields: Object.fromEntries((told.where ?? []).map(({ path, message }) => [path, message])),
  };
}

async function readJson(response: Response): Promise<unknown> {
  if (!response.headers.get('content-type')?.includes('json')) return undefined;
  try {
    return await response.json();
  } catch {
    return undefined;
  }
}

export function retryAfterMs(response: Response): number {
  const seconds = Number(response.headers.get('retry-after'));
  return Number.isFinite(seconds) && seconds > 0 ? seconds * 1000 : RETRY_AFTER_MS_DEFAULT;
}
