import { beforeEach, describe, expect, it } from 'vitest';
import { ANNA, CLUB } from '../../simulation/people.js';
import { makeReception, QuietWorld, type QuietPhone } from '../../simulation/quiet-world.js';
import { stampOf } from '../merge/record-state.js';
import { stampWallMs } from '../stamp/stamp.js';

const MINUTE_MS = 60_000;
const TEN_YEARS_MS = 10 * 365 * 24 * 60 * MINUTE_MS;

let world: QuietWorld;
let phone: QuietPhone;
beforeEach(async () => {
  world = new QuietWorld();
  phone = world.phone('phonea01', ANNA);
  await phone.syncAll();
});

describe('two phones of one person, one 3 minutes fast and one 10 years fast', () => {
  let fast: QuietPhone;
  let id: string;
  beforeEach(async () => {
    id = await makeReception(phone);
    await phone.syncAll();
    phone.skewMs = 3 * MINUTE_MS;
    fast = world.phone('phonea02', ANNA, TEN_YEARS_MS);
    await fast.syncAll();
  });

  async function meet(): Promise<void> {
    for (const one of [phone, fast, phone]) await one.syncAll();
  }

  it('should keep both edits of different fields', async () => {
    await phone.edit(CLUB, 'reception', id, { remarks: 'three minutes' });
    await fast.edit(CLUB, 'reception', id, { heardBy: 'ten years' });
    await meet();
    for (const one of [phone, fast]) {
      expect(one.record(CLUB, 'reception', id).fields).toMatchObject({
        remarks: 'three minutes',
        heardBy: 'ten years',
      });
    }
  });

  it('should let the later stamp win the same field, keep the other in the history, and put it back', async () => {
    await phone.edit(CLUB, 'reception', id, { remarks: 'three minutes' });
    await fast.edit(CLUB, 'reception', id, { remarks: 'ten years' });
    // The fast phone's stamp is refused as ahead and made anew at the server's time: earlier than + 3 minutes.
    await meet();
    expect(stampWallMs(stampOf(fast.record(CLUB, 'reception', id), 'remarks'))).toBe(
      world.nowMs + 3 * MINUTE_MS,
    );
    for (const one of [phone, fast]) {
      expect(one.record(CLUB, 'reception', id).fields.remarks).toBe('three minutes');
      expect(one.records('history').map(({ fields }) => fields)).toMatchObject([
        { field: 'remarks', replaced: { value: 'ten years' }, kept: { value: 'three minutes' }, clash: true },
      ]);
    }
    await phone.edit(CLUB, 'reception', id, { remarks: 'ten years' });
    await meet();
    expect(fast.record(CLUB, 'reception', id).fields.remarks).toBe('ten years');
    expect(world.hub.clubs.get(CLUB)!.history.at(-1)).toMatchObject({
      replaced: { value: 'three minutes' },
      clash: false,
    });
  });

  it('should give new stamps to exactly the unsent values that are ahead', async () => {
    const kept = stampOf(fast.record(CLUB, 'reception', id), 'outcome');
    fast.skewMs = 4 * MINUTE_MS;
    await fast.edit(CLUB, 'reception', id, { heardBy: 'near' });
    const near = stampOf(fast.record(CLUB, 'reception', id), 'heardBy');
    fast.skewMs = 10 * MINUTE_MS;
    await fast.edit(CLUB, 'reception', id, { remarks: 'ahead', stationName: 'ahead too' });
    await fast.syncAll();
    const record = fast.record(CLUB, 'reception', id);
    expect(stampOf(record, 'outcome')).toBe(kept);
    expect(stampOf(record, 'heardBy')).toBe(near);
    expect(stampWallMs(stampOf(record, 'remarks'))).toBe(world.nowMs);
    expect(stampOf(record, 'remarks')).toBe(stampOf(record, 'stationName'));
    expect(fast.disk.state.settings.get('clockOffsetMs')).toBe(-10 * MINUTE_MS);
  });

  it('should log on with the right time once the server has told it, and forget that when the clock is set', async () => {
    expect(fast.disk.state.settings.get('clockOffsetMs')).toBe(-TEN_YEARS_MS);
    await fast.edit(CLUB, 'reception', id, { remarks: 'x' });
    expect(stampWallMs(stampOf(fast.record(CLUB, 'reception', id), 'remarks'))).toBe(world.nowMs);
    fast.skewMs = 0;
    await fast.syncAll();
    expect(fast.disk.state.settings.get('clockOffsetMs')).toBe(0);
  });
});
