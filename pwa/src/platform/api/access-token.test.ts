// @vitest-environment jsdom
import { afterEach, describe, expect, it, vi } from 'vitest';
import { accessTokenFor, dropAccessToken, keepAccessToken } from './access-token';

const IDA = 'account-ida';
const MOGENS = 'account-mogens';
const json = { 'content-type': 'application/json' };

/** A server that answers each refresh with what `answer` makes of the count so far, from 1. */
function serveRefresh(answer: (count: number) => Response | Promise<Response>): { count: number } {
  const seen = { count: 0 };
  vi.stubGlobal('fetch', async () => answer((seen.count += 1)));
  return seen;
}

function session(accountId: string, token: string): Response {
  const account = { id: accountId, name: 'Test', email: 'test@harkmoor.invalid', confirmed: true };
  return new Response(JSON.stringify({ accessToken: token, account, clubs: [] }), { headers: json });
}

afterEach(() => {
  dropAccessToken();
  vi.unstubAllGlobals();
});

describe('the access token', () => {
  it('should be renewed once for all who ask at the same time', async () => {
    const seen = serveRefresh(() => session(IDA, 'one'));
    const answers = await Promise.all([accessTokenFor(IDA), accessTokenFor(IDA), accessTokenFor(IDA)]);
    expect(answers).toEqual(Array(3).fill({ kind: 'token', token: 'one' }));
    expect(seen.count).toBe(1);
  });

  it('should never be given to another account that asks while it is renewed', async () => {
    serveRefresh(() => session(IDA, 'of ida'));
    const [ida, mogens] = await Promise.all([accessTokenFor(IDA), accessTokenFor(MOGENS)]);
    expect(ida).toEqual({ kind: 'token', token: 'of ida' });
    expect(mogens).toEqual({ kind: 'signed-out' });
  });

  it('should be renewed once where it was refused', async () => {
    keepAccessToken(IDA, 'old');
    serveRefresh(() => session(IDA, 'new'));
    expect(await accessTokenFor(IDA)).toEqual({ kind: 'token', token: 'old' });
    expect(await accessTokenFor(IDA, 'old')).toEqual({ kind: 'token', token: 'new' });
  });

  it('should not come back by a renewal that was under way at the sign-out', async () => {
    let arrive: (response: Response) => void = () => undefined;
    const seen = serveRefresh((count) =>
      count === 1
        ? new Promise((resolve) => (arrive = resolve))
        : new Response('{}', { status: 401, headers: json }),
    );
    const asked = accessTokenFor(IDA);
    await vi.waitFor(() => expect(seen.count).toBe(1));
    dropAccessToken();
    arrive(session(IDA, 'late'));
    expect(await asked).toEqual({ kind: 'signed-out' });
    expect(await accessTokenFor(IDA)).toEqual({ kind: 'signed-out' });
  });

  it('should take a portal’s page for no answer, whatever status it has', async () => {
    const page = { headers: { 'content-type': 'text/html' } };
    serveRefresh((count) => new Response('<h1>Welcome</h1>', { ...page, status: count === 1 ? 200 : 401 }));
    expect(await accessTokenFor(IDA)).toEqual({ kind: 'unreachable' });
    expect(await accessTokenFor(IDA)).toEqual({ kind: 'unreachable' });
  });
});
