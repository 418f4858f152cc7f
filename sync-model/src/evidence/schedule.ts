import type { Schedule, Target } from '../records/target.js';

/** How far from its slot an entry may lie and still count as within the schedule. */
export const SCHEDULE_TOLERANCE_MS = 120_000;
/** How far ahead the next change is looked for: any weekly slot comes round within it. */
export const NEXT_CHANGE_REACH_MS = 8 * 86_400_000;

const DAY_MS = 86_400_000;

export type OnAirState =
  | {
      readonly kind: 'on';
      /** UTC ms at which it ends; null: not within 8 days. */ readonly until: number | null;
    }
  | {
      readonly kind: 'off';
      /** UTC ms at which it begins; null: not within 8 days. */ readonly from: number | null;
    };

type Slot = {
  readonly startOfDayMs: number;
  readonly lengthMs: number;
  /** Bit 0 is Monday. */
  readonly dayMask: number;
  readonly validFromMs: number;
  readonly validToMs: number;
};

/**
 * Whether the schedule covers a moment, give or take `toleranceMs`. A slot whose `to` is not after its `from`
 * crosses midnight and belongs to the UTC day on which it starts; validity cuts it at the instants given, the
 * end not included. With no tolerance a slot ends the moment it ends.
 */
export function isOnAir(schedule: Schedule, atMs: number, toleranceMs = SCHEDULE_TOLERANCE_MS): boolean {
  if (schedule === 'always') return true;
  // A slot may have begun the day before; tolerance may reach into one more day on either side.
  const dayFrom = Math.floor((atMs - toleranceMs) / DAY_MS) - 1;
  const dayTo = Math.floor((atMs + toleranceMs) / DAY_MS);
  for (const slot of slotsOf(schedule)) {
    for (let day = dayFrom; day <= dayTo; day++) {
      if (!runsOn(slot, day)) continue;
      const startMs = Math.max(day * DAY_MS + slot.startOfDayMs, slot.validFromMs);
      const endMs = Math.min(day * DAY_MS + slot.startOfDayMs + slot.lengthMs, slot.validToMs);
      if (startMs < endMs && atMs >= startMs - toleranceMs && isBeforeEnd(atMs, endMs, toleranceMs))
        return true;
    }
  }
  return false;
}

/** Whether an organizer has said that the target was off the air at that moment. */
export function isSilenced(target: Pick<Target, 'silences'>, atMs: number): boolean {
  return target.silences.some(({ from, to }) => atMs >= from && atMs < to);
}

/**
 * Whether the target should be on the air now, to the minute of its schedule (no tolerance) and outside its
 * silences, and when that next changes. Slots that touch count as one.
 */
export function onAirState(target: Pick<Target, 'schedule' | 'silences'>, atMs: number): OnAirState {
  const isOn = isOnNow(target, atMs);
  const changeAt =
    boundariesAfter(target, atMs).find((boundary) => isOnNow(target, boundary) !== isOn) ?? null;
  return isOn ? { kind: 'on', until: changeAt } : { kind: 'off', from: changeAt };
}

function isOnNow(target: Pick<Target, 'schedule' | 'silences'>, atMs: number): boolean {
  return isOnAir(target.schedule, atMs, 0) && !isSilenced(target, atMs);
}

function isBeforeEnd(atMs: number, endMs: number, toleranceMs: number): boolean {
  return toleranceMs > 0 ? atMs <= endMs + toleranceMs : atMs < endMs;
}

/** All instants within reach at which the state can change, in order. */
function boundariesAfter(
  { schedule, silences }: Pick<Target, 'schedule' | 'silences'>,
  atMs: number,
): number[] {
  const boundaries = silences.flatMap(({ from, to }) => [from, to]);
  if (schedule !== 'always') {
    const firstDay = Math.floor(atMs / DAY_MS) - 1;
    const lastDay = Math.floor((atMs + NEXT_CHANGE_REACH_MS) / DAY_MS);
    for (const slot of slotsOf(schedule)) {
      boundaries.push(slot.validFromMs, slot.validToMs);
      for (let day = firstDay; day <= lastDay; day++) {
        if (!runsOn(slot, day)) continue;
        const startMs = day * DAY_MS + slot.startOfDayMs;
        boundaries.push(startMs, startMs + slot.lengthMs);
      }
    }
  }
  return boundaries
    .filter((boundary) => boundary > atMs && boundary <= atMs + NEXT_CHANGE_REACH_MS)
    .sort((a, b) => a - b);
}

function runsOn(slot: Slot, dayNumber: number): boolean {
  // 1970-01-01, day 0, was a Thursday: bit 3.
  const weekday = (((dayNumber + 3) % 7) + 7) % 7;
  return (slot.dayMask & (1 << weekday)) !== 0;
}

/** Schedules never change in place, so each is read once however many receptions ask for it. */
const readSchedules = new WeakMap<object, readonly Slot[]>();

function slotsOf(schedule: Exclude<Schedule, 'always'>): readonly Slot[] {
  let slots = readSchedules.get(schedule);
  if (!slots) {
    slots = schedule.map(({ from, to, days, validFrom, validTo }) => {
      const startOfDayMs = msOfDay(from);
      const lengthMs = msOfDay(to) - startOfDayMs;
      return {
        startOfDayMs,
        lengthMs: lengthMs > 0 ? lengthMs : lengthMs + DAY_MS,
        dayMask: days.reduce((mask, day) => mask | (1 << (day - 1)), 0),
        validFromMs: validFrom ?? -Infinity,
        validToMs: validTo ?? Infinity,
      };
    });
    readSchedules.set(schedule, slots);
  }
  return slots;
}

function msOfDay(time: string): number {
  return (Number(time.slice(0, 2)) * 60 + Number(time.slice(3, 5))) * 60_000;
}
