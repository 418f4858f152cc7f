import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { createStamper } from './device-clock.js';
import { formatStamp, isStamp, nextStamp, parseStamp, STAMP_AHEAD_MS_MAX, stampWallMs } from './stamp.js';

const WALL_MS_MAX = 0xffff_ffff_ffff;

const deviceIds = fc.stringMatching(/^[0-9a-z]{8}$/);
const parts = fc.record({
  wallMs: fc.integer({ min: 0, max: WALL_MS_MAX }),
  counter: fc.integer({ min: 0, max: 0xffff }),
  deviceId: deviceIds,
});

describe('a stamp', () => {
  it('should say what it was made of', () => {
    fc.assert(
      fc.property(parts, (made) => {
        expect(isStamp(formatStamp(made))).toBe(true);
        expect(parseStamp(formatStamp(made))).toEqual(made);
      }),
    );
  });

  it('should sort as text by time, then counter, then device', () => {
    fc.assert(
      fc.property(parts, parts, (a, b) => {
        const order = a.wallMs - b.wallMs || a.counter - b.counter || (a.deviceId < b.deviceId ? -1 : 1);
        if (formatStamp(a) === formatStamp(b)) return;
        expect(formatStamp(a) < formatStamp(b)).toBe(order < 0);
      }),
    );
  });

  it('should be later than all that it follows, whatever the clock says', () => {
    const before = fc.array(
      parts.filter(({ wallMs }) => wallMs < WALL_MS_MAX).map((made) => formatStamp(made)),
    );
    fc.assert(
      fc.property(fc.double(), before, deviceIds, (wallMs, after, deviceId) => {
        const stamp = nextStamp(deviceId, wallMs, after);
        expect(isStamp(stamp)).toBe(true);
        for (const one of after) expect(stamp > one).toBe(true);
      }),
    );
  });

  it('should go on with the next millisecond where the counter is used up', () => {
    const full = formatStamp({ wallMs: 5, counter: 0xffff, deviceId: 'zzzzzzzz' });
    expect(nextStamp('00000000', 5, [full])).toBe(
      formatStamp({ wallMs: 6, counter: 0, deviceId: '00000000' }),
    );
  });

  it.each(['', '0190000000000000device', '0190000000000000DEVICEA1', 7, null, '0190000000000000devicea1\n'])(
    'should not be taken from %j',
    (text) => {
      expect(isStamp(text)).toBe(false);
    },
  );
});

describe('the stamps of one device', () => {
  it('should never run backwards while its clock goes back by no more than five minutes', () => {
    const steps = fc.array(fc.integer({ min: -1000, max: 60_000 }), { maxLength: 100 });
    fc.assert(
      fc.property(steps, (changesMs) => {
        let nowMs = 1_000_000;
        const stamp = createStamper({ deviceId: 'devicea1', nowMs: () => nowMs });
        let last = stamp();
        for (const changeMs of changesMs) {
          nowMs += changeMs;
          const next = stamp();
          expect(next > last).toBe(true);
          last = next;
        }
      }),
    );
  });

  it('should follow a clock that was set right, yet stay later than the value that is replaced', () => {
    let nowMs = 2_000_000_000_000;
    const stamp = createStamper({ deviceId: 'devicea1', nowMs: () => nowMs });
    const ahead = stamp();
    nowMs -= 10 * STAMP_AHEAD_MS_MAX;
    expect(stampWallMs(stamp())).toBe(nowMs);
    expect(stamp([ahead]) > ahead).toBe(true);
    expect(stampWallMs(stamp())).toBe(nowMs);
  });
});
