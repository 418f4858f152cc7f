import { beforeEach, describe, expect, it } from 'vitest';
import { ANNA } from '../../simulation/people.js';
import { QuietWorld } from '../../simulation/quiet-world.js';
import {
  at,
  edit,
  everything,
  gear,
  hubClub,
  hubRecord,
  NOW_MS,
  push,
  reception,
  site,
  SITE,
} from '../../simulation/sample-round.js';

let world: QuietWorld;
beforeEach(() => {
  world = new QuietWorld();
});

describe('values that meet', () => {
  beforeEach(async () => {
    await push(world, [site()]);
  });

  it('should keep the later and put the earlier into the history, whichever comes first', async () => {
    await push(world, [edit('site', SITE, { notes: 'later' }, at(20, 'phonea02'))]);
    await push(world, [edit('site', SITE, { notes: 'earlier' }, at(10))]);
    expect(hubRecord(world, 'site', SITE)?.fields.notes).toBe('later');
    const rows = hubClub(world).history.map(({ replaced, kept, clash }) => [
      replaced.value,
      kept.value,
      clash,
    ]);
    expect(rows).toEqual([
      [null, 'later', false],
      ['earlier', 'later', true],
    ]);
  });

  it('should send rows marked clash through the feed, once', async () => {
    await push(world, [edit('site', SITE, { notes: 'later' }, at(20, 'phonea02'))]);
    const losing = edit('site', SITE, { notes: 'earlier' }, at(10));
    const first = await push(world, [losing]);
    const second = await push(world, [losing]);
    expect(second.results).toEqual(first.results);
    const rows = second.records.filter(({ type }) => type === 'history');
    expect(rows).toHaveLength(1);
    expect(rows[0]?.fields).toMatchObject({ recordId: SITE, field: 'notes', byId: ANNA, clash: true });
    expect(hubClub(world).seq).toBe(3);
  });

  it('should make no row of a whole record that comes again after others have edited it', async () => {
    await push(world, [edit('site', SITE, { notes: 'b' }, at(20, 'phonea02'))]);
    await push(world, [edit('site', SITE, { notes: 'c' }, at(30, 'phonea02'), at(20, 'phonea02'))]);
    const before = everything(world);
    expect((await push(world, [site()])).results[0]).toMatchObject({ status: 'applied', seq: 3 });
    expect(everything(world)).toBe(before);
  });

  it('should keep the size alone of a long value in the history', async () => {
    await push(world, [edit('site', SITE, { notes: 'ø'.repeat(4000) }, at(1))]);
    expect(hubClub(world).history[0]?.kept.value).toEqual({ leftOutBytes: 8002 });
  });

  it('should keep both of two edits in one round of one record', async () => {
    const changes = [edit('site', SITE, { notes: 'a' }, at(10)), edit('site', SITE, { name: 'b' }, at(11))];
    const answer = await push(world, changes);
    expect(hubRecord(world, 'site', SITE)?.fields).toMatchObject({ notes: 'a', name: 'b' });
    expect(answer.results.map((result) => result.status === 'applied' && result.seq)).toEqual([2, 2]);
  });
});

describe('deletion of what is referred to', () => {
  it('should retire a site that a reception refers to, by an edit of the server', async () => {
    await push(world, [site(), ...gear(), reception()]);
    world.nowMs += 60_000;
    const answer = await push(world, [edit('site', SITE, { deleted: true }, at(30))], ANNA, 5);
    expect(hubRecord(world, 'site', SITE)?.fields).toMatchObject({ deleted: false, retiredAt: world.nowMs });
    expect(hubRecord(world, 'site', SITE)?.stamps?.deleted).toMatch(/harkmoor$/);
    expect(answer.records.map(({ id }) => id)).toContain(SITE);
    const before = everything(world);
    await push(world, [edit('site', SITE, { deleted: true }, at(30))]);
    expect(everything(world)).toBe(before);
  });

  it('should delete a site that nothing refers to', async () => {
    await push(world, [site()]);
    await push(world, [edit('site', SITE, { deleted: true }, at(1))]);
    expect(hubRecord(world, 'site', SITE)?.fields).toMatchObject({ deleted: true, retiredAt: null });
  });

  it('should bring a deleted site back as retired when a reception from there arrives', async () => {
    await push(world, [site(), ...gear()]);
    await push(world, [edit('site', SITE, { deleted: true }, at(1))]);
    await push(world, [reception()]);
    expect(hubRecord(world, 'site', SITE)?.fields).toMatchObject({ deleted: false, retiredAt: NOW_MS });
  });

  it('should retire it where deletion and reception come in one round', async () => {
    await push(world, [site(), ...gear()]);
    await push(world, [edit('site', SITE, { deleted: true }, at(1)), reception()]);
    expect(hubRecord(world, 'site', SITE)?.fields).toMatchObject({ deleted: false, retiredAt: NOW_MS });
  });
});
