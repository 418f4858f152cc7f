import { beforeEach, describe, expect, it } from 'vitest';
import { ANNA, BO } from '../../simulation/people.js';
import { QuietWorld } from '../../simulation/quiet-world.js';
import {
  at,
  clubOf,
  edit,
  gear,
  push,
  reception,
  request,
  site,
  SITE,
} from '../../simulation/sample-round.js';

let world: QuietWorld;
beforeEach(() => {
  world = new QuietWorld();
});

describe('a round that fetches', () => {
  it('should not send back what the caller holds already', async () => {
    const answer = await push(world, [site(), ...gear()]);
    expect(answer.records).toEqual([]);
    expect(answer.cursor).toBe(4);
    const edited = await push(world, [edit('site', SITE, { notes: 'x' }, at(1))], ANNA, 4);
    expect(edited.records).toEqual([]);
  });

  it('should be at the head after a push larger than a page, with nothing to fetch', async () => {
    world = new QuietWorld({ changesPerRound: 10, changesPerTransaction: 2, recordsPerPage: 3 });
    const answer = await push(world, [site(), ...gear(), reception()]);
    expect(answer).toMatchObject({ records: [], cursor: 5, headSeq: 5, more: false });
  });

  it("should send another's record that stands before and between those of the caller", async () => {
    await push(world, [site()], BO);
    const answer = await push(world, [...gear(), reception()]);
    expect(answer.records.map(({ id }) => id)).toEqual([SITE]);
    expect(answer).toMatchObject({ cursor: 5, more: false });
  });

  it('should send a record of this round where the caller does not hold the merged form', async () => {
    await push(world, [site()]);
    await push(world, [edit('site', SITE, { notes: 'theirs' }, at(5, 'phonea02'))], ANNA, 1);
    const answer = await push(world, [edit('site', SITE, { name: 'ours' }, at(6))], ANNA, 1);
    expect(answer.records.map(({ fields }) => fields)).toMatchObject([{ notes: 'theirs', name: 'ours' }]);
  });

  it('should leave empty fields out and keep their stamps', async () => {
    await push(world, [site()]);
    await push(world, [edit('site', SITE, { notes: 'x' }, at(1))]);
    await push(world, [edit('site', SITE, { notes: null }, at(2), at(1))]);
    const [record] = (await push(world, [], BO)).records;
    expect(record?.fields).not.toHaveProperty('notes');
    expect(record?.stamps).toEqual({ notes: at(2) });
  });

  it('should name clubs that were not asked for, without records', async () => {
    await push(world, [site()]);
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
    await push(world, [site(), ...gear(), reception()]);
    const first = await push(world, [], BO);
    const second = await push(world, [], BO, first.cursor);
    expect([first.more, second.more]).toEqual([true, false]);
    expect([...first.records, ...second.records].map(({ seq }) => seq)).toEqual([1, 2, 3, 4, 5]);
  });

  it('should start again where the phone knows another history', async () => {
    await push(world, [site()]);
    const ask = request([], { cursor: 1 });
    ask.clubs[0]!.historyId = 'before the restore';
    expect(clubOf(await world.ask(BO, ask)).records).toHaveLength(1);
  });
});
