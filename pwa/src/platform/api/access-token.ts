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
/** One renewal an account: what one account's renewal answers is never handed to another that asks meanwhile. */
const renewing = new Map<string, Promise<TokenAnswer>>();
/** Counts sign-outs, so that a renewal which was under way then leaves no token behind. */
let signOuts = 0;
const listeners = new Set<(body: SignInBody) => void>();

export function keepAccessToken(accountId: string, token: string): void {
  held = { accountId, token, renewAtMs: performance.now() + RENEW_AFTER_MS };
}

export function dropAccessToken(): void {
  held = null;
  signOuts += 1;
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
  const underWay = renewing.get(accountId);
  if (underWay) return underWay;
  const renewal = renewAcrossTabs(accountId).finally(() => renewing.delete(accountId));
  renewing.set(accountId, renewal);
  return renewal;
}

/** Two tabs that renewed at once would look like a stolen cookie; the lock makes them take turns. */
function renewAcrossTabs(accountId: string): Promise<TokenAnswer> {
  if (!('locks' in navigator)) return renew(accountId);
  return navigator.locks.request('harkmoor-refresh', () => renew(accountId));
}

async function renew(accountId: string): Promise<TokenAnswer> {
  const signOutsBefore = signOuts;
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
  if (response.status === 401 && isJson(response)) return { kind: 'signed-out' };
  const body = response.ok ? await readSignIn(response) : null;
  if (!body) return { kind: 'unreachable' };
  if (body.account.id !== accountId || signOuts !== signOutsBefore) return { kind: 'signed-out' };
  keepAccessToken(accountId, body.accessToken);
  for (const listener of listeners) listener(body);
  return { kind: 'token', token: body.accessToken };
}

/** Null for a captive portal's page, a broken body, or anything else that is no answer of ours. */
async function readSignIn(response: Response): Promise<SignInBody | null> {
  if (!isJson(response)) return null;
  try {
    const body = (await response.json()) as Partial<SignInBody>;
    const isWhole = typeof body.accessToken === 'string' && typeof body.account?.id === 'string';
    return isWhole ? (body as SignInBody) : null;
  } catch {
    return null;
  }
}

/** Our API refuses in JSON; a portal that wants its own sign-in does not, and ends nobody's session here. */
export function isJson(response: Response): boolean {
  return response.headers.get('content-type')?.includes('application/json') === true;
}
