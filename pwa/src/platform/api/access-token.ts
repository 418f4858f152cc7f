/**
 * The access token of the signed-in account: in memory alone, made again from the refresh cookie when it is
 * missing or old. A token is only ever handed out for the account that asks, so nothing of one person can be
 * sent with the credentials of another.
 */
export type TokenAnswer = { kind: 'token'; token: string } | { kind: 'signed-out' } | { kind: 'unreachable' };

export type SignInBody = {
  accessToken: string;
  account: { id: string; name: string; email: string; confirmed: boolean };
  clubs: unknown[];
};

type Held = { accountId: string; token: string; renewAtMs: number };

/** The token lives 15 minutes; it is renewed before a slow request can meet its end. */
const RENEW_AFTER_MS = 12 * 60_000;
const REFRESH_TIMEOUT_MS = 20_000;

let held: Held | null = null;
let renewing: Promise<TokenAnswer> | null = null;
const listeners = new Set<(body: SignInBody) => void>();

export function keepAccessToken(accountId: string, token: string): void {
  held = { accountId, token, renewAtMs: performance.now() + RENEW_AFTER_MS };
}

export function dropAccessToken(): void {
  held = null;
}

/** Called with each refresh answer: it tells changes of name, confirmation and clubs. */
export function onSessionTold(listener: (body: SignInBody) => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

/** `after` names a token that was refused, so that one refusal makes one renewal. */
export async function accessTokenFor(accountId: string, after?: string): Promise<TokenAnswer> {
  if (held?.accountId === accountId && held.token !== after && performance.now() < held.renewAtMs) {
    return { kind: 'token', token: held.token };
  }
  renewing ??= renewAcrossTabs(accountId).finally(() => {
    renewing = null;
  });
  return renewing;
}

/** Two tabs that renewed at once would look like a stolen cookie; the lock makes them take turns. */
function renewAcrossTabs(accountId: string): Promise<TokenAnswer> {
  if (!('locks' in navigator)) return renew(accountId);
  return navigator.locks.request('harkmoor-refresh', () => renew(accountId));
}

async function renew(accountId: string): Promise<TokenAnswer> {
  let response: Response;
  try {
    response = await fetch('/api/accounts/refresh', {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: '{}',
      signal: AbortSignal.timeout(REFRESH_TIMEOUT_MS),
    });
  } catch {
    return { kind: 'unreachable' };
  }
  if (response.status === 401) return { kind: 'signed-out' };
  const body = response.ok ? await readSignIn(response) : null;
  if (!body) return { kind: 'unreachable' };
  if (body.account.id !== accountId) return { kind: 'signed-out' };
  keepAccessToken(accountId, body.accessToken);
  for (const listener of listeners) listener(body);
  return { kind: 'token', token: body.accessToken };
}

/** Null for a captive portal's page, a broken body, or anything else that is no answer of ours. */
async function readSignIn(response: Response): Promise<SignInBody | null> {
  if (!response.headers.get('content-type')?.includes('application/json')) return null;
  try {
    const body = (await response.json()) as Partial<SignInBody>;
    const isWhole = typeof body.accessToken === 'string' && typeof body.account?.id === 'string';
    return isWhole ? (body as SignInBody) : null;
  } catch {
    return null;
  }
}
