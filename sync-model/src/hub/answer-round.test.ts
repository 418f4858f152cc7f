import { beforeEach, describe, expect, it } from 'vitest';
import { ANNA, ANNAS_LOG, BO, BOS_LOG, CLUB, idOf } from '../../simulation/people.js';
import { QuietWorld } from '../../simulation/quiet-world.js';
import { SAMPLES } from '../../simulation/sample-fields.js';
import type { Change, SyncAnswer, SyncClubAnswer, SyncRequest } from '../protocol/messages.js';
import { formatStamp, type Stamp } from '../stamp/stamp.js';

const SITE = idOf(1);
const RECEIVER = idOf(2);
const ANTENNA = idOf(3);
const SETUP = idOf(4);
const RECEPTION = idOf(5);
const UNKNOWN = idOf(99);
const NOW_MS = Date.UTC(2026, 5, 1);

let world: QuietWorld;
beforeEach(() => {
  world = new QuietWorld();
});

function at(second: number, deviceId = 'phonea01'): Stamp {
  return formatStamp({ wallMs: NOW_MS + second * 1000, counter: 0, deviceId });
}

function whole(type: Change['type'], id: string, fields: object, stamp = at(0)): Change {
  return { type, id, at: stamp, fields: { ...fields } };
}

function edit(
  type: Change['type'],
  id: string,
  fields: object,
  stamp: Stamp,
  base: Stamp | null = at(0),
): Change {
  const bases = Object.keys(fields).flatMap((field) => (base ? [[field, base] as const] : []));
  return { type, id, at: stamp, fields: { ...fields }, base: Object.fromEntries(bases) };
}

function request(changes: Change[], { clubId = CLUB, cursor = 0 } = {}): SyncRequest {
  const clubs = [{ clubId, historyId: null, cursor, changes }];
  return { protocol: 1, deviceId: 'phonea01', sentAt: NOW_MS, clubs };
}

async function push(changes: Change[], accountId = ANNA, cursor = 0): Promise<SyncClubAnswer> {
  return clubOf(await world.ask(accountId, request(changes, { cursor })));
}

function clubOf(answer: SyncAnswer, clubId = CLUB): SyncClubAnswer {
  const club = answer.clubs.find((one) => one.clubId === clubId);
  if (!club) throw new Error('the answer has no such club');
  return club;
}

const everything = () =>
  JSON.stringify([...world.hub.clubs.values()].map((club) => [...club.records, ...club.history, club.seq]));
const hubClub = (clubId = CLUB) => world.hub.clubs.get(clubId)!;
const hubRecord = (type: string, id: string) => hubClub().records.get(`${type}/${id}`);

const site = () => whole('site', SITE, SAMPLES.site('Ravnklit'));
const gear = () => [
  whole('receiver', RECEIVER, SAMPLES.receiver('bag receiver')),
  whole('antenna', ANTENNA, SAMPLES.antenna('long wire')),
  whole('setup', SETUP, SAMPLES.setup(RECEIVER, ANTENNA)),
];
const reception = () => whole('reception', RECEPTION, SAMPLES.reception(SITE, SETUP));

describe('a round that brings changes', () => {
  it('should give new records their owner and the next places in the feed', async () => {
    const answer = await push([site(), ...gear(), reception()]);
    expect(answer.results.map((result) => result.status === 'applied' && result.seq)).toEqual([
      1, 2, 3, 4, 5,
    ]);
    expect(answer).toMatchObject({ headSeq: 5, cursor: 5, more: false });
    expect(hubRecord('reception', RECEPTION)).toMatchObject({ ownerId: ANNA, seq: 5 });
  });

  it('should change nothing when it comes again, and answer the same', async () => {
    const first = await push([site(), ...gear(), reception()]);
    const before = everything();
    const second = await push([site(), ...gear(), reception()]);
    expect(second.results).toEqual(first.results);
    expect(everything()).toBe(before);
  });

  it('should take all others where one is bad, and say what is wrong with it', async () => {
    const bad = whole('receiver', RECEIVER, { ...SAMPLES.receiver('x'), name: 'x'.repeat(61) });
    const [taken, refused] = (await push([site(), bad])).results;
    expect(taken).toMatchObject({ status: 'applied', seq: 1 });
    expect(refused).toMatchObject({ status: 'refused', code: 'invalid' });
    expect(refused?.status === 'refused' && refused.message).toContain('“name”');
  });

  it.each([
    ['an unknown field', whole('site', SITE, { ...SAMPLES.site('x'), latDeg: 55.1 }), 'invalid'],
    ['an empty field that must be filled', whole('site', SITE, { name: 'x' }), 'invalid'],
    [
      'a stamp without a value',
      { ...edit('site', SITE, { name: 'x' }, at(1)), stamps: { notes: at(1) } },
      'invalid',
    ],
    [
      'a base without a value',
      { ...edit('site', SITE, { name: 'x' }, at(1)), base: { notes: at(1) } },
      'invalid',
    ],
    ['a change of nothing', { ...edit('site', SITE, {}, at(1)), base: {} }, 'invalid'],
    [
      'a text that is too long for any record',
      whole('site', SITE, { ...SAMPLES.site('x'), notes: 'x'.repeat(300_000) }),
      'too-large',
    ],
  ])('should refuse %s', async (_what, change, code) => {
    expect((await push([change as Change])).results[0]).toMatchObject({ status: 'refused', code });
    expect(hubClub().seq).toBe(0);
  });

  it('should hold a child whose parent it does not know, and take it after the parent', async () => {
    const held = await push([site(), reception()]);
    expect(held.results[1]).toMatchObject({ status: 'held', needs: SETUP });
    const taken = await push([...gear(), reception()]);
    expect(taken.results.at(-1)).toMatchObject({ status: 'applied' });
  });

  it('should know no parent of another club', async () => {
    await world.ask(ANNA, request([site()], { clubId: ANNAS_LOG }));
    const answer = await push([...gear(), reception()]);
    expect(answer.results.at(-1)).toMatchObject({ status: 'held', needs: SITE });
  });

  it('should ask for the whole record where it does not know the one that a change is of', async () => {
    const answer = await push([edit('site', SITE, { name: 'x' }, at(1))]);
    expect(answer.results[0]).toMatchObject({ status: 'refused', code: 'whole-record-needed' });
  });

  it('should apply nothing of a round in which any stamp is more than five minutes ahead', async () => {
    const ahead = { ...site(), stamps: { name: at(301) } };
    const answer = await world.ask(ANNA, request([...gear(), ahead]));
    expect(answer).toMatchObject({ code: 'clock-ahead', serverTime: NOW_MS, clubs: [] });
    expect(hubClub().seq).toBe(0);
    expect((await push([{ ...site(), stamps: { name: at(300) } }])).results[0]?.status).toBe('applied');
  });

  it('should tell a phone that is too old, and take nothing', async () => {
    const answer = await world.ask(ANNA, { ...request([site()]), protocol: 0 });
    expect(answer).toMatchObject({ code: 'protocol-too-old', clubs: [] });
    expect(hubClub().seq).toBe(0);
  });
});

describe('rights in a round', () => {
  it("should not let a member change another's reception", async () => {
    await push([site(), ...gear(), reception()]);
    const before = everything();
    const answer = await push([edit('reception', RECEPTION, { remarks: 'mine now' }, at(1, 'phoneb01'))], BO);
    expect(answer.results[0]).toMatchObject({ status: 'refused', code: 'forbidden' });
    const again = await push(
      [whole('reception', RECEPTION, SAMPLES.reception(SITE, SETUP), at(2, 'phoneb01'))],
      BO,
    );
    expect(again.results[0]).toMatchObject({ status: 'refused', code: 'forbidden' });
    expect(everything()).toBe(before);
  });

  it.each([
    ["another person's log", BOS_LOG],
    ['a club that does not exist', UNKNOWN],
  ])('should say nothing of %s and change nothing in it', async (_what, clubId) => {
    const before = everything();
    const answer = await world.ask(ANNA, request([site()], { clubId }));
    expect(answer.goneClubs).toEqual([clubId]);
    expect(answer.clubs.map((club) => club.clubId).sort()).toEqual([CLUB, ANNAS_LOG].sort());
    expect(everything()).toBe(before);
  });

  it("should take targets into an own draft that is made in the same round, and not into another's", async () => {
    const [list, target] = [idOf(10), idOf(11)];
    const draft = whole('target-list', list, SAMPLES['target-list']('evenings'));
    const own = await push([draft, whole('target', target, SAMPLES.target('x', list))]);
    expect(own.results.map(({ status }) => status)).toEqual(['applied', 'applied']);
    const others = await push([whole('target', idOf(12), SAMPLES.target('y', list))], BO);
    expect(others.results[0]).toMatchObject({ status: 'refused', code: 'forbidden' });
    const moved = await push([edit('target', target, { note: 'x' }, at(1, 'phoneb01'))], BO);
    expect(moved.results[0]).toMatchObject({ status: 'refused', code: 'forbidden' });
  });

  it('should not let a member move a target of their draft into a published list', async () => {
    const [published, draft, target] = [idOf(10), idOf(11), idOf(12)];
    await push([whole('target-list', published, { ...SAMPLES['target-list']('a'), publishedAt: NOW_MS })]);
    hubMember(BO, 'member');
    await push(
      [
        whole('target-list', draft, SAMPLES['target-list']('b')),
        whole('target', target, SAMPLES.target('x', draft)),
      ],
      BO,
    );
    const answer = await push([edit('target', target, { listId: published }, at(1, 'phoneb01'))], BO);
    expect(answer.results[0]).toMatchObject({ status: 'refused', code: 'forbidden' });
  });

  it('should answer a repeat as applied though the right has gone since', async () => {
    const list = whole('target-list', idOf(10), { ...SAMPLES['target-list']('a'), publishedAt: NOW_MS });
    await push([list], BO);
    hubMember(BO, 'member');
    expect((await push([list], BO)).results[0]).toMatchObject({ status: 'applied', seq: 1 });
  });
});

function hubMember(accountId: string, role: 'member' | 'organizer'): void {
  world.hub.put({ ...hubClub(), members: new Map(hubClub().members).set(accountId, role) });
}

describe('values that meet', () => {
  beforeEach(async () => {
    await push([site()]);
  });

  it('should keep the later and put the earlier into the history, whichever comes first', async () => {
    await push([edit('site', SITE, { notes: 'later' }, at(20, 'phonea02'))]);
    await push([edit('site', SITE, { notes: 'earlier' }, at(10))]);
    expect(hubRecord('site', SITE)?.fields.notes).toBe('later');
    const rows = hubClub().history.map(({ replaced, kept, clash }) => [replaced.value, kept.value, clash]);
    expect(rows).toEqual([
      [null, 'later', false],
      ['earlier', 'later', true],
    ]);
  });

  it('should send rows marked clash through the feed, once', async () => {
    await push([edit('site', SITE, { notes: 'later' }, at(20, 'phonea02'))]);
    const losing = edit('site', SITE, { notes: 'earlier' }, at(10));
    const first = await push([losing]);
    const second = await push([losing]);
    expect(second.results).toEqual(first.results);
    const rows = second.records.filter(({ type }) => type === 'history');
    expect(rows).toHaveLength(1);
    expect(rows[0]?.fields).toMatchObject({ recordId: SITE, field: 'notes', byId: ANNA, clash: true });
    expect(hubClub().seq).toBe(3);
  });

  it('should make no row of a whole record that comes again after others have edited it', async () => {
    await push([edit('site', SITE, { notes: 'b' }, at(20, 'phonea02'))]);
    await push([edit('site', SITE, { notes: 'c' }, at(30, 'phonea02'), at(20, 'phonea02'))]);
    const before = everything();
    expect((await push([site()])).results[0]).toMatchObject({ status: 'applied', seq: 3 });
    expect(everything()).toBe(before);
  });

  it('should keep the size alone of a long value in the history', async () => {
    await push([edit('site', SITE, { notes: 'ø'.repeat(4000) }, at(1))]);
    expect(hubClub().history[0]?.kept.value).toEqual({ leftOutBytes: 8002 });
  });

  it('should keep both of two edits in one round of one record', async () => {
    const changes = [edit('site', SITE, { notes: 'a' }, at(10)), edit('site', SITE, { name: 'b' }, at(11))];
    const answer = await push(changes);
    expect(hubRecord('site', SITE)?.fields).toMatchObject({ notes: 'a', name: 'b' });
    expect(answer.results.map((result) => result.status === 'applied' && result.seq)).toEqual([2, 2]);
  });
});

describe('deletion of what is referred to', () => {
  it('should retire a site that a reception refers to, by an edit of the server', async () => {
    await push([site(), ...gear(), reception()]);
    world.nowMs += 60_000;
    const answer = await push([edit('site', SITE, { deleted: true }, at(30))], ANNA, 5);
    expect(hubRecord('site', SITE)?.fields).toMatchObject({ deleted: false, retiredAt: world.nowMs });
    expect(hubRecord('site', SITE)?.stamps?.deleted).toMatch(/harkmoor$/);
    expect(answer.records.map(({ id }) => id)).toContain(SITE);
    const before = everything();
    await push([edit('site', SITE, { deleted: true }, at(30))]);
    expect(everything()).toBe(before);
  });

  it('should delete a site that nothing refers to', async () => {
    await push([site()]);
    await push([edit('site', SITE, { deleted: true }, at(1))]);
    expect(hubRecord('site', SITE)?.fields).toMatchObject({ deleted: true, retiredAt: null });
  });

  it('should bring a deleted site back as retired when a reception from there arrives', async () => {
    await push([site(), ...gear()]);
    await push([edit('site', SITE, { deleted: true }, at(1))]);
    await push([reception()]);
    expect(hubRecord('site', SITE)?.fields).toMatchObject({ deleted: false, retiredAt: NOW_MS });
  });

  it('should retire it where deletion and reception come in one round', async () => {
    await push([site(), ...gear()]);
    await push([edit('site', SITE, { deleted: true }, at(1)), reception()]);
    expect(hubRecord('site', SITE)?.fields).toMatchObject({ deleted: false, retiredAt: NOW_MS });
  });
});

describe('a round that fetches', () => {
  it('should not send back what the caller holds already', async () => {
    const answer = await push([site(), ...gear()]);
    expect(answer.records).toEqual([]);
    expect(answer.cursor).toBe(4);
    const edited = await push([edit('site', SITE, { notes: 'x' }, at(1))], ANNA, 4);
    expect(edited.records).toEqual([]);
  });

  it('should send a record of this round where the caller does not hold the merged form', async () => {
    await push([site()]);
    await push([edit('site', SITE, { notes: 'theirs' }, at(5, 'phonea02'))], ANNA, 1);
    const answer = await push([edit('site', SITE, { name: 'ours' }, at(6))], ANNA, 1);
    expect(answer.records.map(({ fields }) => fields)).toMatchObject([{ notes: 'theirs', name: 'ours' }]);
  });

  it('should leave empty fields out and keep their stamps', async () => {
    await push([site()]);
    await push([edit('site', SITE, { notes: 'x' }, at(1))]);
    await push([edit('site', SITE, { notes: null }, at(2), at(1))]);
    const [record] = (await push([], BO)).records;
    expect(record?.fields).not.toHaveProperty('notes');
    expect(record?.stamps).toEqual({ notes: at(2) });
  });

  it('should name clubs that were not asked for, without records', async () => {
    await push([site()]);
    const answer = await world.ask(ANNA, { ...request([]), clubs: [] });
    expect(clubOf(answer)).toMatchObject({
      cursor: 0,
      records: [],
      more: true,
      headSeq: 1,
      role: 'organizer',
    });
  });

  it('should cut pages and lose nothing between them', async () => {
    world = new QuietWorld({ changesPerRound: 10, changesPerTransaction: 2, recordsPerPage: 3 });
    await push([site(), ...gear(), reception()]);
    const first = await push([], BO);
    const second = await push([], BO, first.cursor);
    expect([first.more, second.more]).toEqual([true, false]);
    expect([...first.records, ...second.records].map(({ seq }) => seq)).toEqual([1, 2, 3, 4, 5]);
  });

  it('should start again where the phone knows another history', async () => {
    await push([site()]);
    const ask = request([], { cursor: 1 });
    ask.clubs[0]!.historyId = 'before the restore';
    expect(clubOf(await world.ask(BO, ask)).records).toHaveLength(1);
  });
});
