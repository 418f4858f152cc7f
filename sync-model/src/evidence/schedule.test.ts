import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { ScheduleSlot } from '../records/target.js';
import { isOnAir, NEXT_CHANGE_REACH_MS, onAirState } from './schedule.js';

const MINUTE_MS = 60_000;
const DAY_MS = 86_400_000;
/** Thursday 12 November 2026. */
const thursday = (hour: number, minute = 0) => Date.UTC(2026, 10, 12, hour, minute);
const friday = (hour: number, minute = 0) => Date.UTC(2026, 10, 13, hour, minute);
const EVERY_DAY = [1, 2, 3, 4, 5, 6, 7];
const slot = (from: string, to: string, days = EVERY_DAY, validity = {}): ScheduleSlot => ({
  from,
  to,
  days,
  ...validity,
});

describe('isOnAir', () => {
  it('should cover two minutes before the start and after the end', () => {
    const evening = [slot('19:00', '20:00')];
    expect(isOnAir(evening, thursday(18, 58))).toBe(true);
    expect(isOnAir(evening, thursday(20, 2))).toBe(true);
    expect(isOnAir(evening, thursday(18, 58) - 1)).toBe(false);
    expect(isOnAir(evening, thursday(20, 2) + 1)).toBe(false);
  });

  it('should end on the minute when no tolerance is asked for', () => {
    expect(isOnAir([slot('19:00', '20:00')], thursday(20) - 1, 0)).toBe(true);
    expect(isOnAir([slot('19:00', '20:00')], thursday(20), 0)).toBe(false);
  });

  it('should give the hours after midnight to the day on which the slot began', () => {
    const thursdays = [slot('22:00', '02:00', [4])];
    expect(isOnAir(thursdays, friday(1, 30))).toBe(true);
    expect(isOnAir(thursdays, thursday(1, 30))).toBe(false);
    expect(isOnAir(thursdays, friday(22, 30))).toBe(false);
  });

  it('should take a slot that ends as it begins for a whole day', () => {
    expect(isOnAir([slot('06:00', '06:00', [4])], friday(5, 59), 0)).toBe(true);
    expect(isOnAir([slot('06:00', '06:00', [4])], friday(6), 0)).toBe(false);
  });

  it('should reach over two midnights when a day-long slot ends just before the second', () => {
    // Wednesday 23:59 to Thursday 23:59, and two minutes more: Friday 00:01.
    expect(isOnAir([slot('23:59', '23:59', [3])], friday(0, 1))).toBe(true);
  });

  it('should keep to the dates between which a slot is valid', () => {
    const season = [slot('19:00', '20:00', EVERY_DAY, { validFrom: friday(0), validTo: friday(19, 30) })];
    expect(isOnAir(season, thursday(19, 30))).toBe(false);
    expect(isOnAir(season, friday(19, 15))).toBe(true);
    expect(isOnAir(season, friday(19, 45))).toBe(false);
  });

  it('should always cover a target without a schedule', () => {
    expect(isOnAir('always', thursday(3))).toBe(true);
  });
});

describe('onAirState', () => {
  const target = (schedule: 'always' | ScheduleSlot[], silences: { from: number; to: number }[] = []) => ({
    schedule,
    silences,
  });

  it('should tell until when and from when', () => {
    const evening = target([slot('19:00', '20:00', [4])]);
    expect(onAirState(evening, thursday(19, 10))).toEqual({ kind: 'on', until: thursday(20) });
    expect(onAirState(evening, thursday(18))).toEqual({ kind: 'off', from: thursday(19) });
    expect(onAirState(evening, thursday(20))).toEqual({ kind: 'off', from: thursday(19) + 7 * DAY_MS });
  });

  it('should join slots that touch', () => {
    const night = target([slot('22:00', '00:00'), slot('00:00', '02:00')]);
    expect(onAirState(night, thursday(23))).toEqual({ kind: 'on', until: friday(2) });
  });

  it('should know no change for a target that is always on or has ended', () => {
    expect(onAirState(target('always'), thursday(12))).toEqual({ kind: 'on', until: null });
    const over = target([slot('19:00', '20:00', EVERY_DAY, { validTo: thursday(0) })]);
    expect(onAirState(over, thursday(12))).toEqual({ kind: 'off', from: null });
  });

  it('should be off during a silence', () => {
    const silent = target('always', [{ from: thursday(0), to: friday(0) }]);
    expect(onAirState(silent, thursday(12))).toEqual({ kind: 'off', from: friday(0) });
    expect(onAirState(silent, thursday(0) - 1)).toEqual({ kind: 'on', until: thursday(0) });
  });
});

// Goal: the schedule's arithmetic equals a plain walk through the minutes of its slots.
// Method: random weekly slots, and a recount that knows only "this slot, started on that day, runs from here to there".
describe('any schedule', () => {
  const aTimeOfDay = fc
    .tuple(fc.nat(23), fc.constantFrom(0, 1, 30, 59))
    .map(([hour, minute]) => `${String(hour).padStart(2, '0')}:${String(minute).padStart(2, '0')}`);
  const aSlot = fc.record({
    from: aTimeOfDay,
    to: aTimeOfDay,
    days: fc.uniqueArray(fc.integer({ min: 1, max: 7 }), { minLength: 1, maxLength: 7 }),
  });
  const someSlots = fc.array(aSlot, { minLength: 1, maxLength: 4 });
  const aMinute = fc.integer({ min: 0, max: 14 * 1440 }).map((minutes) => thursday(0) + minutes * MINUTE_MS);

  function isCovered(slots: ScheduleSlot[], atMs: number, toleranceMs: number): boolean {
    const midnight = Math.floor(atMs / DAY_MS) * DAY_MS;
    return slots.some((one) =>
      [-2, -1, 0, 1].some((days) => {
        const dayMs = midnight + days * DAY_MS;
        const isoDay = new Date(dayMs).getUTCDay() || 7;
        const startMs = Date.parse(`${new Date(dayMs).toISOString().slice(0, 10)}T${one.from}:00Z`);
        const sameDayEnd = Date.parse(`${new Date(dayMs).toISOString().slice(0, 10)}T${one.to}:00Z`);
        const endMs = sameDayEnd <= startMs ? sameDayEnd + DAY_MS : sameDayEnd;
        if (!one.days.includes(isoDay) || atMs < startMs - toleranceMs) return false;
        return toleranceMs > 0 ? atMs <= endMs + toleranceMs : atMs < endMs;
      }),
    );
  }

  it('should cover a moment as the plain walk does, with and without tolerance', () => {
    fc.assert(
      fc.property(someSlots, aMinute, (slots, atMs) => {
        expect(isOnAir(slots, atMs)).toBe(isCovered(slots, atMs, 2 * MINUTE_MS));
        expect(isOnAir(slots, atMs, 0)).toBe(isCovered(slots, atMs, 0));
      }),
    );
  });

  it('should not change before the change that it tells, and then change', () => {
    fc.assert(
      fc.property(someSlots, aMinute, fc.double({ min: 0, max: 1, noNaN: true }), (slots, atMs, share) => {
        const state = onAirState({ schedule: slots, silences: [] }, atMs);
        const isOn = state.kind === 'on';
        const changeAt = state.kind === 'on' ? state.until : state.from;
        const lastMs = changeAt ?? atMs + NEXT_CHANGE_REACH_MS;
        const between = Math.floor(atMs + share * (lastMs - 1 - atMs));
        expect(isCovered(slots, between, 0)).toBe(isOn);
        if (changeAt !== null) expect(isCovered(slots, changeAt, 0)).toBe(!isOn);
      }),
    );
  });
});
