import { gzipSync } from 'node:zlib';
import { v7 } from 'uuid';
import { ROUND_BYTES_MAX } from '@harkmoor/sync-model/protocol/limits';
import { syncAnswerSchema } from '@harkmoor/sync-model/protocol/message-schemas';
import type { Change, SyncAnswer } from '@harkmoor/sync-model/protocol/messages';
import { PROTOCOL_VERSION } from '@harkmoor/sync-model/protocol/version';
import { WRITABLE_TYPES } from '@harkmoor/sync-model/records/record-types';
import { makeApp, type TestApp } from '../app.js';
import { MailCatcher } from '../mail-catcher.js';
import { foundClub, makePerson, type Person } from '../people.js';
import { EVENING_MS, stampAt } from './hub.js';
import { misfits } from './misfits.js';
import { edit, newRecord, sampleOfEachType } from './sample-records.js';

const mail = new MailCatcher();
let server: TestApp;
let owner: Person;
let other: Person;
let clubId: string;
beforeAll(async () => {
  server = await makeApp({ MAIL_URL: await mail.start() });
  owner = await makePerson(server, mail, 'Inger Marsk');
  other = await makePerson(server, mail, 'Bo Revle');
  const founded = await foundClub(owner);
  clubId = founded.clubId;
  await other.visitor.post('/api/clubs/join', { code: founded.code });
});
afterAll(async () => {
  await server.close();
  await mail.stop();
});

function requestOf(changes: unknown[], club = clubId, cursor = 0) {
  const clubs = [{ clubId: club, historyId: null, cursor, changes }];
  return { protocol: PROTOCOL_VERSION, deviceId: 'phone001', sentAt: Date.now(), clubs };
}

async function round(person: Person, changes: Change[], club = clubId): Promise<SyncAnswer> {
  const answer = await person.visitor.post('/api/sync', requestOf(changes, club));
  if (answer.status !== 200) throw new Error(`${answer.status} ${answer.text.slice(0, 500)}`);
  return syncAnswerSchema.parse(answer.body) as SyncAnswer;
}

const antenna = (name = 'Whip') => newRecord('antenna', { name, kind: 'whip', sharedUse: false });

describe('the sync endpoint', () => {
  it('should be closed to whoever is not signed in', async () => {
    const answer = await fetch(`${server.url}/api/sync`, {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify(requestOf([])),
    });
    expect(answer.status).toBe(401);
  });

  it('should take a compressed round and answer compressed', async () => {
    const records = Array.from({ length: 50 }, (_, n) => antenna(`Whip ${n}`));
    const { status, body } = await owner.visitor.postGzip(
      '/api/sync',
      Buffer.from(JSON.stringify(requestOf(records))),
    );
    expect(status).toBe(200);
    const [club] = syncAnswerSchema.parse(body).clubs.filter((part) => part.clubId === clubId);
    expect(club!.results.map((result) => result.status)).toEqual(records.map(() => 'applied'));
    const pulled = await other.visitor.send('POST', '/api/sync', requestOf([]), {
      headers: { 'Accept-Encoding': 'gzip' },
    });
    expect(pulled.headers.get('content-encoding')).toBe('gzip');
  });

  it('should tell of all clubs of the account, also those that it did not ask for', async () => {
    const { clubs } = await round(owner, []);
    expect(clubs.map((club) => club.card.kind).sort()).toEqual(['club', 'my-log']);
  });

  it('should refuse a gzip bomb and a round that is too large, without reading it all', async () => {
    const bomb = gzipSync(Buffer.alloc(256 * 1024 * 1024, ' '));
    expect(bomb.length).toBeLessThan(400_000);
    const headers = { 'Content-Encoding': 'gzip' };
    const before = process.memoryUsage().rss;
    const refused = await owner.visitor.send('POST', '/api/sync', bomb, { headers });
    expect([refused.status, refused.body.code]).toEqual([413, 'too-large']);
    expect(process.memoryUsage().rss - before).toBeLessThan(128 * 1024 * 1024);
    const large = await owner.visitor.post('/api/sync', ' '.repeat(ROUND_BYTES_MAX + 100_000));
    expect([large.status, large.body.code]).toEqual([413, 'too-large']);
  });

  it.each([
    ['no JSON', '{"protocol":'],
    ['a list', '[]'],
    ['nothing of a round', '{}'],
    ['an unknown part', JSON.stringify({ ...requestOf([]), extra: 1 })],
    ['an unknown type', JSON.stringify(requestOf([{ ...antenna(), type: 'member' }]))],
    ['a stamp that is none', JSON.stringify(requestOf([{ ...antenna(), at: 'now' }]))],
    ['an id that is none', JSON.stringify(requestOf([{ ...antenna(), id: "' or 1=1 --" }]))],
    ['a club that is none', JSON.stringify(requestOf([], '../../etc'))],
    ['a cursor below nothing', JSON.stringify(requestOf([], clubIdOf(), -1))],
    ['1 001 changes', JSON.stringify(requestOf(Array.from({ length: 1001 }, () => antenna())))],
  ])('should refuse %s with a sentence, the place and no stack', async (_what, body) => {
    const answer = await owner.visitor.post('/api/sync', body);
    expect([answer.status, answer.body.code]).toEqual([400, 'invalid']);
    expect(answer.body.message).toEqual(expect.stringMatching(/\.$/));
    expect(answer.text).not.toMatch(/at .*\.(ts|js):|node_modules|select |insert /i);
  });

  it('should refuse each value that a schema does not take, name its field, and apply the rest', async () => {
    const sample = sampleOfEachType();
    const { ['site-fix']: fix, ...inClub } = sample;
    await round(owner, Object.values(inClub));
    for (const type of WRITABLE_TYPES) {
      const club = type === 'site-fix' ? owner.myLogId : clubId;
      const bad = misfits().filter((misfit) => misfit.type === type);
      expect(bad.length).toBeGreaterThan(20);
      const changes = bad.map(({ field, value }) => ({
        ...newRecord(type, { ...sample[type].fields, [field]: value }),
      }));
      const good = antenna(`Beside ${type}`);
      const { clubs } = await round(owner, [...changes, good], club);
      const { results } = clubs.find((part) => part.clubId === club)!;
      bad.forEach(({ field, value }, index) => {
        expect({ field, value, ...results[index] }).toMatchObject({
          status: 'refused',
          code: 'invalid',
          message: expect.stringContaining(`“${field}`) as string,
        });
      });
      expect(results.at(-1)).toMatchObject({ id: good.id, status: 'applied' });
    }
    expect(fix.fields).toBeDefined();
  });

  it('should refuse the same values as edits, and leave the record as it was', async () => {
    const record = antenna();
    await round(owner, [record]);
    const bad = misfits().filter((misfit) => misfit.type === 'antenna');
    const edits = bad.map(({ field, value }) => edit(record, { [field]: value }, stampAt(EVENING_MS + 9)));
    const { clubs } = await round(owner, edits);
    const { results } = clubs.find((part) => part.clubId === clubId)!;
    expect(results.filter(({ status }) => status !== 'refused')).toEqual([]);
    const feed = (await round(other, [])).clubs.find((part) => part.clubId === clubId)!.records;
    expect(feed.find(({ id }) => id === record.id)).toMatchObject({ at: record.at, fields: record.fields });
  });

  it('should refuse unknown fields by name and never take a prototype for one', async () => {
    const record = antenna();
    const text = JSON.stringify(requestOf([record, antenna()])).replace(
      '"deleted":false',
      '"deleted":false,"__proto__":{"sharedUse":true},"isAdmin":true',
    );
    const answer = await owner.visitor.post('/api/sync', text);
    const part = (answer.body as unknown as SyncAnswer).clubs.find((club) => club.clubId === clubId)!;
    expect(part.results).toMatchObject([
      {
        id: record.id,
        status: 'refused',
        code: 'invalid',
        message: expect.stringContaining('isAdmin') as string,
      },
      { status: 'applied' },
    ]);
    expect(({} as Record<string, unknown>).sharedUse).toBeUndefined();
  });

  it.each(['notes', 'name'])(
    'should refuse half a character in the %s, and apply the rest',
    async (field) => {
      const half = newRecord('antenna', {
        name: 'Whip',
        kind: 'whip',
        sharedUse: false,
        [field]: 'half \ud83d',
      });
      const whole = antenna('Whole 😀');
      const { clubs } = await round(owner, [half, whole]);
      expect(clubs.find((part) => part.clubId === clubId)!.results).toMatchObject([
        { status: 'refused', code: 'invalid', message: expect.stringContaining(field) as string },
        { status: 'applied' },
      ]);
    },
  );

  it('should keep script text in a free text exactly as it was written', async () => {
    const record = newRecord('antenna', {
      name: `<img src=x onerror="alert('1')">`,
      kind: 'whip',
      sharedUse: false,
      notes: `"; drop table antenna; -- $1 ? \\ ${'{{x}}'} </script>`,
    });
    await round(owner, [record]);
    const feed = (await round(other, [])).clubs.find((part) => part.clubId === clubId)!.records;
    expect(feed.find(({ id }) => id === record.id)!.fields).toMatchObject(record.fields);
  });
});

/** For tables of cases, which are made before the club is. */
function clubIdOf(): string {
  return v7();
}
