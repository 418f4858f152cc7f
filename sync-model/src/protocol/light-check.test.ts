import { describe, expect, it } from 'vitest';
import { asSyncAnswer } from './light-check.js';
import { syncAnswerSchema } from './message-schemas.js';
import type { SyncAnswer } from './messages.js';

const CLUB = '01890000-0000-7000-8000-000000000001';
const RECORD = '01890000-0000-7000-8000-000000000002';
const STAMP = '0190000000000000devicea1';

function answer(): SyncAnswer {
  return {
    protocol: 1,
    serverTime: 1_700_000_000_000,
    clubs: [
      {
        clubId: CLUB,
        role: 'member',
        card: { name: 'Dune listeners', kind: 'club', ituRegion: 1, demo: false },
        historyId: 'h1',
        headSeq: 4,
        results: [
          { type: 'site', id: RECORD, status: 'applied', seq: 3 },
          { type: 'outing', id: RECORD, status: 'held', needs: RECORD },
          { type: 'outing', id: RECORD, status: 'refused', code: 'invalid', message: 'No.' },
        ],
        records: [
          {
            type: 'site',
            id: RECORD,
            ownerId: CLUB,
            seq: 4,
            at: STAMP,
            fields: { name: 'Moor' },
            stamps: { name: STAMP },
          },
        ],
        cursor: 4,
        more: false,
      },
    ],
    goneClubs: [],
  };
}

type Path = readonly (string | number)[];

/** A copy in which one part is replaced; undefined takes it out. */
function broken(path: Path, value: unknown): unknown {
  const copy = structuredClone(answer()) as unknown as Record<string | number, unknown>;
  let place = copy;
  for (const step of path.slice(0, -1)) place = place[step] as typeof place;
  place[path.at(-1)!] = value;
  return copy;
}

const CLUB_PATH: Path = ['clubs', 0];
const RECORD_PATH: Path = [...CLUB_PATH, 'records', 0];

describe('asSyncAnswer', () => {
  it('should take a complete answer, and so does the schema', () => {
    expect(asSyncAnswer(answer())).toEqual(answer());
    expect(syncAnswerSchema.parse(answer())).toEqual(answer());
  });

  it.each([
    ['the page of a captive portal', '<html><body>Welcome to the guest network</body></html>'],
    ['nothing', undefined],
    ['an empty object', {}],
    ['a list', []],
    ['an error of some proxy', { error: 'bad gateway', statusCode: 502 }],
    ['no server time', broken(['serverTime'], undefined)],
    ['an unknown code', broken(['code'], 'please-wait')],
    ['clubs that are no list', broken(['clubs'], {})],
    ['a club without a cursor', broken([...CLUB_PATH, 'cursor'], undefined)],
    ['a cursor past the head', broken([...CLUB_PATH, 'cursor'], 5)],
    ['a cursor that is no whole number', broken([...CLUB_PATH, 'cursor'], 1.5)],
    ['an unknown role', broken([...CLUB_PATH, 'role'], 'owner')],
    ['a missing card', broken([...CLUB_PATH, 'card'], null)],
    ['a result without a status', broken([...CLUB_PATH, 'results', 0, 'status'], undefined)],
    ['an applied result without seq', broken([...CLUB_PATH, 'results', 0, 'seq'], undefined)],
    ['a held result without its parent', broken([...CLUB_PATH, 'results', 1, 'needs'], undefined)],
    ['a refusal of an unknown kind', broken([...CLUB_PATH, 'results', 2, 'code'], 'no')],
    ['a broken stamp', broken([...RECORD_PATH, 'at'], STAMP.slice(1))],
    ['a broken stamp of a field', broken([...RECORD_PATH, 'stamps', 'name'], 7)],
    ['fields that are no object', broken([...RECORD_PATH, 'fields'], [])],
    [
      'more records than a page holds',
      broken(
        [...CLUB_PATH, 'records'],
        Array.from({ length: 1001 }, () => answer().clubs[0]!.records[0]),
      ),
    ],
    ['gone clubs that are no list', broken(['goneClubs'], undefined)],
  ])('should not take %s for an answer', (_what, body) => {
    expect(asSyncAnswer(body)).toBeNull();
  });

  it('should leave out a record of a type that is not known here', () => {
    const result = asSyncAnswer(broken([...RECORD_PATH, 'type'], 'moon-bounce'));
    expect(result?.clubs[0]?.records).toEqual([]);
  });
});
