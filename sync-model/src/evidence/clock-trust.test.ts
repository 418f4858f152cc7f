import { describe, expect, it } from 'vitest';
import { clockTrust } from './clock-trust.js';
import { nearestMinute, toneCheck } from './tone-check.js';

const NOW = Date.UTC(2026, 10, 12, 18, 42, 7);
const HOUR = 3_600_000;
const checkAt = (deviceAt: number) => ({ deviceId: 'abcdefgh', deviceAt, offsetMs: 300, uncertaintyMs: 100 });

describe('the state of the clock', () => {
  it('should be unchecked without any check, and without one that was not deleted', () => {
    expect(clockTrust([], [], NOW).kind).toBe('unchecked');
    expect(clockTrust([{ ...checkAt(NOW - HOUR), deleted: true }], [], NOW).kind).toBe('unchecked');
  });

  it('should take the newest check and say its age', () => {
    const trust = clockTrust([checkAt(NOW - 2 * HOUR), checkAt(NOW - 9 * HOUR)], [], NOW);
    expect(trust).toEqual({ kind: 'checked', check: checkAt(NOW - 2 * HOUR), ageMs: 2 * HOUR });
  });

  it('should be old past twelve hours, on either side of now', () => {
    expect(clockTrust([checkAt(NOW - 12 * HOUR)], [], NOW).kind).toBe('checked');
    expect(clockTrust([checkAt(NOW - 12 * HOUR - 1)], [], NOW).kind).toBe('old');
    expect(clockTrust([checkAt(NOW + 13 * HOUR)], [], NOW).kind).toBe('old');
  });

  it('should say a step until the next check', () => {
    const step = { at: NOW - HOUR, stepMs: 45_000 };
    expect(clockTrust([checkAt(NOW - 2 * HOUR)], [step], NOW).kind).toBe('stepped');
    expect(clockTrust([], [step], NOW).kind).toBe('stepped');
    expect(clockTrust([checkAt(NOW - HOUR)], [step], NOW).kind).toBe('checked');
  });
});

describe('a check by the minute tone', () => {
  const minute = Date.UTC(2026, 10, 12, 18, 43);

  it('should find a device that is 700 ms slow', () => {
    expect(toneCheck([minute - 700])).toEqual({ deviceAt: minute - 700, offsetMs: 700, uncertaintyMs: 300 });
  });

  it('should take the median of several taps and trust them by their spread', () => {
    const taps = [minute - 700, minute + 60_000 - 760, minute + 120_000 - 300];
    expect(toneCheck(taps)).toEqual({ deviceAt: taps[2], offsetMs: 700, uncertaintyMs: 230 });
  });

  it('should follow a device that is a whole minute off once the minute is corrected', () => {
    expect(toneCheck([minute + 50], 1).offsetMs).toBe(59_950);
    expect(nearestMinute(minute + 29_999)).toBe(minute);
    expect(nearestMinute(minute + 30_000)).toBe(minute + 60_000);
  });

  it('should take off the way of the tone: 1 500 km are 5 ms at 299 792.458 km/s', () => {
    expect(toneCheck([minute], 0, 1500).offsetMs).toBe(5);
  });
});
