import { beforeEach, describe, expect, it } from 'vitest';
import { ANNA, CLUB } from '../../simulation/people.js';
import { makeReception, QuietWorld, type QuietPhone } from '../../simulation/quiet-world.js';
import { SAMPLES } from '../../simulation/sample-fields.js';

const MINUTE_MS = 60_000;
const YEAR_MS = 365 * 24 * 60 * MINUTE_MS;

/** Rounds of one change, so that a page can arrive before a value of ours is sent. */
let world: QuietWorld;
let phone: QuietPhone;
let other: QuietPhone;
let id: string;

beforeEach(async () => {
  world = new QuietWorld({ changesPerRound: 1, changesPerTransaction: 1, recordsPerPage: 50 });
  phone = world.phone('phonea01', ANNA);
  other = world.phone('phonea02', ANNA);
  for (const one of [phone, other]) await one.syncAll();
  id = await makeReception(phone);
  for (const one of [phone, other]) await one.syncAll();
});

describe('an unsent value that a later one from elsewhere replaces', () => {
  it('should still reach the history, and not stop the edit that follows', async () => {
    await phone.edit(CLUB, 'reception', id, { remarks: 'ours' });
    world.nowMs += MINUTE_MS;
    await other.edit(CLUB, 'reception', id, { remarks: 'theirs' });
    await other.syncAll();
    // The new site takes the only place of the round, so the page arrives before our value is sent.
    await phone.make(CLUB, 'site', SAMPLES.site('other site'));
    await phone.engine.runRound();
    expect(phone.record(CLUB, 'reception', id).fields.remarks).toBe('theirs');
    expect(phone.record(CLUB, 'reception', id).debt?.lost).toMatchObject([
      { field: 'remarks', value: 'ours' },
    ]);
    await phone.edit(CLUB, 'reception', id, { remarks: 'ours again' });
    for (const one of [phone, other]) await one.syncAll();
    expect(other.record(CLUB, 'reception', id).fields.remarks).toBe('ours again');
    const rows = world.hub.clubs
      .get(CLUB)!
      .history.map(({ replaced, kept, clash }) => [replaced.value, kept.value, clash]);
    expect(rows).toEqual([
      [null, 'theirs', false],
      ['ours', 'theirs', true],
      ['theirs', 'ours again', false],
    ]);
    expect(other.records('history')).toHaveLength(1);
  });
});

describe('an unsent value that stays above a later one from elsewhere', () => {
  it('should stay above it when it gets a new stamp', async () => {
    await phone.make(CLUB, 'site', SAMPLES.site('other site'));
    phone.skewMs = 10 * YEAR_MS;
    await phone.edit(CLUB, 'reception', id, { remarks: 'ours' });
    other.skewMs = 3 * MINUTE_MS;
    await other.edit(CLUB, 'reception', id, { remarks: 'theirs' });
    await other.syncAll();
    await phone.engine.runRound();
    expect(phone.record(CLUB, 'reception', id).fields.remarks).toBe('ours');
    for (const one of [phone, other, phone]) await one.syncAll();
    for (const one of [phone, other]) {
      expect(one.record(CLUB, 'reception', id).fields.remarks).toBe('ours');
    }
    expect(world.hub.clubs.get(CLUB)!.history.at(-1)).toMatchObject({
      replaced: { value: 'theirs' },
      clash: true,
    });
  });
});
