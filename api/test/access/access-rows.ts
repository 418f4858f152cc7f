import { nextStamp } from '@harkmoor/sync-model/stamp/stamp';
import { PASSWORD } from '../people.js';

/** What exists when the table is asked. */
export type World = {
  /** The club whose things every row asks for. */
  readonly clubId: string;
  /** Somebody in that club whose role may be changed without harm to the other rows. */
  readonly targetId: string;
  /** Opens another club. */
  readonly otherCode: string;
  readonly email: string;
};

export const VIEWERS = ['anonymous', 'outsider', 'former', 'member', 'organizer', 'admin'] as const;
export type Viewer = (typeof VIEWERS)[number];

export type AccessRow = {
  readonly route: string;
  /** The path with its parameters; the route's own where it has none. */
  readonly path?: (world: World) => string;
  /** A body that is right in everything, so that only access decides. */
  readonly body?: (world: World) => unknown;
  /** The status for each viewer, in the order of `VIEWERS`. */
  readonly expected: readonly [number, number, number, number, number, number];
};

const all = (status: number): AccessRow['expected'] => [status, status, status, status, status, status];
const signedIn = (status: number): AccessRow['expected'] => [401, status, status, status, status, status];

const ANY_TOKEN = 'A'.repeat(43);
const NOBODY = 'nobody.at.all@harkmoor.test';
const SOME_RECORD = '01a22fe4-a845-7498-a81b-56378b1c63d0';

/** One row a route; a route without one fails the test. */
export const ACCESS_ROWS: readonly AccessRow[] = [
  { route: 'GET /api/health', expected: all(200) },

  {
    route: 'POST /api/accounts/sign-up',
    body: ({ email }) => ({ name: 'Somebody', email, password: PASSWORD }),
    expected: all(202),
  },
  { route: 'POST /api/accounts/confirm', body: () => ({ token: ANY_TOKEN }), expected: all(400) },
  { route: 'POST /api/accounts/confirm-again', body: () => ({}), expected: signedIn(202) },
  {
    route: 'POST /api/accounts/sign-in',
    body: () => ({ email: NOBODY, password: PASSWORD, deviceId: 'phone001', deviceName: 'Phone' }),
    expected: all(401),
  },
  // by the cookie alone, which the viewers of this table do not send
  { route: 'POST /api/accounts/refresh', body: () => ({}), expected: all(401) },
  { route: 'POST /api/accounts/sign-out', body: () => ({}), expected: all(204) },
  { route: 'POST /api/accounts/reset-request', body: () => ({ email: NOBODY }), expected: all(202) },
  {
    route: 'POST /api/accounts/reset',
    body: () => ({ token: ANY_TOKEN, password: PASSWORD }),
    expected: all(400),
  },
  { route: 'GET /api/accounts/me', expected: signedIn(200) },

  { route: 'POST /api/clubs', body: () => ({ name: 'New club', ituRegion: 1 }), expected: signedIn(201) },
  { route: 'POST /api/clubs/join', body: ({ otherCode }) => ({ code: otherCode }), expected: signedIn(200) },
  {
    route: 'GET /api/clubs/:clubId',
    path: ({ clubId }) => `/api/clubs/${clubId}`,
    expected: [401, 404, 404, 200, 200, 200],
  },
  {
    route: 'POST /api/clubs/:clubId/join-code',
    path: ({ clubId }) => `/api/clubs/${clubId}/join-code`,
    body: () => ({}),
    expected: [401, 404, 404, 403, 403, 201],
  },
  {
    route: 'GET /api/clubs/:clubId/members',
    path: ({ clubId }) => `/api/clubs/${clubId}/members`,
    expected: [401, 404, 404, 200, 200, 200],
  },
  {
    route: 'PATCH /api/clubs/:clubId/members/:accountId',
    path: ({ clubId, targetId }) => `/api/clubs/${clubId}/members/${targetId}`,
    body: () => ({ role: 'member' }),
    expected: [401, 404, 404, 403, 403, 200],
  },

  {
    route: 'GET /api/clubs/:clubId/records/:type/:id/history',
    path: ({ clubId }) => `/api/clubs/${clubId}/records/reception/${SOME_RECORD}/history`,
    expected: [401, 404, 404, 200, 200, 200],
  },
  // whose clubs it tells of is held in test/sync/notices.test.ts
  { route: 'GET /api/sync/notices', expected: signedIn(200) },
  // who is not in a club gets an answer that leaves the club out; what a round may change is held in test/sync
  {
    route: 'POST /api/sync',
    body: ({ clubId }) => ({
      protocol: 1,
      deviceId: 'phone001',
      sentAt: Date.now(),
      clubs: [{ clubId, historyId: null, cursor: 0, changes: [clockCheck()] }],
    }),
    expected: signedIn(200),
  },
];

/** A small change that names no other record. */
function clockCheck(): object {
  const deviceAt = Date.now();
  return {
    type: 'clock-check',
    id: SOME_RECORD,
    at: nextStamp('phone001', deviceAt, []),
    fields: { deviceId: 'phone001', deviceAt, offsetMs: 0, uncertaintyMs: 500, method: 'tone' },
  };
}
