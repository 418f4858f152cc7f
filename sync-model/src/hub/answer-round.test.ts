import { beforeEach, describe, expect, it } from 'vitest';
import { ANNA, ANNAS_LOG, BO, BOS_LOG, CLUB, idOf } from '../../simulation/people.js';
import { QuietWorld } from '../../simulation/quiet-world.js';
import { SAMPLES } from '../../simulation/sample-fields.js';
import {
  at,
  edit,
  everything,
  gear,
  hubClub,
  hubRecord,
  NOW_MS,
  push,
  RECEIVER,
  reception,
  RECEPTION,
  request,
  SETUP,
  site,
  SITE,
  whole,
} from '../../simulation/sample-round.js';
import type { Change } from '../protocol/messages.js';

let world: QuietWorld;
beforeEach(() => {
  world = new QuietWorld();
});

describe('a round that brings changes', () => {
  it('should give new records their owner and the next places in the feed', async () => {
    const answer = await push(world, [site(), ...gear(), reception()]);
    expect(answer.results.map((result) => result.status === 'applied' && result.seq)).toEqual([
      1, 2, 3, 4, 5,
    ]);
    expect(answer).toMatchObject({ headSeq: 5, cursor: 5, more: false });
    expect(hubRecord(world, 'reception', RECEPTION)).toMatchObject({ ownerId: ANNA, seq: 5 });
  });

  it('should change nothing when it comes again, and answer the same', async () => {
    const first = await push(world, [site(), ...gear(), reception()]);
    const before = everything(world);
    const second = await push(world, [site(), ...gear(), reception()]);
    expect(second.results).toEqual(first.results);
    expect(everything(world)).toBe(before);
  });

  it('should take all others where one is bad, and say what is wrong with it', async () => {
    const bad = whole('receiver', RECEIVER, { ...SAMPLES.receiver('x'), name: 'x'.repeat(61) });
    const [taken, refused] = (await push(world, [site(), bad])).results;
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
    expect((await push(world, [change as Change])).results[0]).toMatchObject({ status: 'refused', code });
    expect(hubClub(world).seq).toBe(0);
  });

  it('should hold a child whose parent it does not know, and take it after the parent', async () => {
    const held = await push(world, [site(), reception()]);
    expect(held.results[1]).toMatchObject({ status: 'held', needs: SETUP });
    const taken = await push(world, [...gear(), reception()]);
    expect(taken.results.at(-1)).toMatchObject({ status: 'applied' });
  });

  it('should know no parent of another club', async () => {
    await world.ask(ANNA, request([site()], { clubId: ANNAS_LOG }));
    const answer = await push(world, [...gear(), reception()]);
    expect(answer.results.at(-1)).toMatchObject({ status: 'held', needs: SITE });
  });

  it('should ask for the whole record where it does not know the one that a change is of', async () => {
    const answer = await push(world, [edit('site', SITE, { name: 'x' }, at(1))]);
    expect(answer.results[0]).toMatchObject({ status: 'refused', code: 'whole-record-needed' });
  });

  it('should apply nothing of a round in which any stamp is more than five minutes ahead', async () => {
    const ahead = { ...site(), stamps: { name: at(301) } };
    const answer = await world.ask(ANNA, request([...gear(), ahead]));
    expect(answer).toMatchObject({ code: 'clock-ahead', serverTime: NOW_MS, clubs: [] });
    expect(hubClub(world).seq).toBe(0);
    expect((await push(world, [{ ...site(), stamps: { name: at(300) } }])).results[0]?.status).toBe(
      'applied',
    );
  });

  it('should tell a phone that is too old, and take nothing', async () => {
    const answer = await world.ask(ANNA, { ...request([site()]), protocol: 0 });
    expect(answer).toMatchObject({ code: 'protocol-too-old', clubs: [] });
    expect(hubClub(world).seq).toBe(0);
  });
});

describe('rights in a round', () => {
  it("should not let a member change another's reception", async () => {
    await push(world, [site(), ...gear(), reception()]);
    const before = everything(world);
    const answer = await push(
      world,
      [edit('reception', RECEPTION, { remarks: 'mine now' }, at(1, 'phoneb01'))],
      BO,
    );
    expect(answer.results[0]).toMatchObject({ status: 'refused', code: 'forbidden' });
    const again = await push(
      world,
      [whole('reception', RECEPTION, SAMPLES.reception(SITE, SETUP), at(2, 'phoneb01'))],
      BO,
    );
    expect(again.results[0]).toMatchObject({ status: 'refused', code: 'forbidden' });
    expect(everything(world)).toBe(before);
  });

  it.each([
    ["another person's log", BOS_LOG],
    ['a club that does not exist', idOf(99)],
  ])('should say nothing of %s and change nothing in it', async (_what, clubId) => {
    const before = everything(world);
    const answer = await world.ask(ANNA, request([site()], { clubId }));
    expect(answer.goneClubs).toEqual([clubId]);
    expect(answer.clubs.map((club) => club.clubId).sort()).toEqual([CLUB, ANNAS_LOG].sort());
    expect(everything(world)).toBe(before);
  });

  it("should take targets into an own draft that is made in the same round, and not into another's", async () => {
    const [list, target] = [idOf(10), idOf(11)];
    const draft = whole('target-list', list, SAMPLES['target-list']('evenings'));
    const own = await push(world, [draft, whole('target', target, SAMPLES.target('x', list))]);
    expect(own.results.map(({ status }) => status)).toEqual(['applied', 'applied']);
    const others = await push(world, [whole('target', idOf(12), SAMPLES.target('y', list))], BO);
    expect(others.results[0]).toMatchObject({ status: 'refused', code: 'forbidden' });
    const moved = await push(world, [edit('target', target, { note: 'x' }, at(1, 'phoneb01'))], BO);
    expect(moved.results[0]).toMatchObject({ status: 'refused', code: 'forbidden' });
  });

  it('should not let a member move a target of their draft into a published list', async () => {
    const [published, draft, target] = [idOf(10), idOf(11), idOf(12)];
    await push(world, [
      whole('target-list', published, { ...SAMPLES['target-list']('a'), publishedAt: NOW_MS }),
    ]);
    hubMember(BO, 'member');
    await push(
      world,
      [
        whole('target-list', draft, SAMPLES['target-list']('b')),
        whole('target', target, SAMPLES.target('x', draft)),
      ],
      BO,
    );
    const answer = await push(world, [edit('target', target, { listId: published }, at(1, 'phoneb01'))], BO);
    expect(answer.results[0]).toMatchObject({ status: 'refused', code: 'forbidden' });
  });

  it('should answer a repeat as applied though the right has gone since', async () => {
    const list = whole('target-list', idOf(10), { ...SAMPLES['target-list']('a'), publishedAt: NOW_MS });
    await push(world, [list], BO);
    hubMember(BO, 'member');
    expect((await push(world, [list], BO)).results[0]).toMatchObject({ status: 'applied', seq: 1 });
  });
});

function hubMember(accountId: string, role: 'member' | 'organizer'): void {
  world.hub.put({ ...hubClub(world), members: new Map(hubClub(world).members).set(accountId, role) });
}
