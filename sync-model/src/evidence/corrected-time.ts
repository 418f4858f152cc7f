import type { ClockCheck } from '../records/clock-check.js';

/** A clock check further than this from a reception, by the device's own clock, says nothing about it. */
export const CHECK_REACH_MS = 12 * 3_600_000;

/**
 * How a corrected time came about: on the line between a check before and one after, from the nearest check on
 * one side, or from the raw time alone because no check reaches it.
 */
export type TimeBasis = 'between' | 'nearest' | 'unchecked';

export type CorrectedTime = {
  /** UTC, whole ms. */
  readonly atMs: number;
  readonly basis: TimeBasis;
  /** true − device, ms; 0 when unchecked. */
  readonly offsetMs: number;
};

export type RawTime = { readonly deviceAt: number; readonly deviceId: string };

export type TimeCheck = Pick<ClockCheck, 'deviceId' | 'deviceAt' | 'offsetMs' | 'uncertaintyMs'> & {
  readonly deleted?: boolean;
};

/** A jump of one device's clock; `at` is what that clock showed right after the jump, ms. */
export type DeviceStep = { readonly deviceId: string; readonly at: number };

type DeviceLine = { checks: TimeCheck[]; stepsAt: number[] };

/** Checks and steps sorted per device, so that each of many receptions costs two binary searches. */
export type ClockIndex = ReadonlyMap<string, Readonly<DeviceLine>>;

/**
 * The true time of a reception from the device's clock checks within ±12 h and with no step of the clock
 * between: linear between the nearest before and after, else the nearest one, else the raw time, marked
 * `unchecked`. Order and deletion of checks don't matter to the caller: deleted ones are passed over.
 *
 * A clock put back runs through some minutes twice; raw times alone can't tell the two runs apart, so a reception
 * made in them may take a check from the wrong side. The error is at most the size of the step.
 */
export function correctedAt(
  time: RawTime,
  checks: readonly TimeCheck[],
  steps: readonly DeviceStep[],
): CorrectedTime {
  const isOfDevice = ({ deviceId }: { deviceId: string }) => deviceId === time.deviceId;
  return correctedBy(clockIndex(checks.filter(isOfDevice), steps.filter(isOfDevice)), time);
}

/** Sorts the checks and steps of all devices once, for `correctedBy`. */
export function clockIndex(checks: readonly TimeCheck[], steps: readonly DeviceStep[]): ClockIndex {
  const lines = new Map<string, DeviceLine>();
  const lineOf = (deviceId: string): DeviceLine => {
    let line = lines.get(deviceId);
    if (!line) lines.set(deviceId, (line = { checks: [], stepsAt: [] }));
    return line;
  };
  for (const check of checks) if (!check.deleted) lineOf(check.deviceId).checks.push(check);
  for (const step of steps) lineOf(step.deviceId).stepsAt.push(step.at);
  for (const line of lines.values()) {
    line.checks.sort(byTimeThenTrust);
    line.checks = line.checks.filter((check, i) => check.deviceAt !== line.checks[i - 1]?.deviceAt);
    line.stepsAt.sort((a, b) => a - b);
  }
  return lines;
}

/** As `correctedAt`, against an index made once. */
export function correctedBy(index: ClockIndex, { deviceAt, deviceId }: RawTime): CorrectedTime {
  const line = index.get(deviceId);
  if (!line || line.checks.length === 0) return unchecked(deviceAt);
  const next = firstAfter(line.checks, deviceAt, (check) => check.deviceAt);
  const before = usable(line, line.checks[next - 1], deviceAt);
  const after = usable(line, line.checks[next], deviceAt);
  if (before && after) {
    const share = (deviceAt - before.deviceAt) / (after.deviceAt - before.deviceAt);
    return corrected(deviceAt, 'between', before.offsetMs + share * (after.offsetMs - before.offsetMs));
  }
  const only = before ?? after;
  return only ? corrected(deviceAt, 'nearest', only.offsetMs) : unchecked(deviceAt);
}

function usable(line: DeviceLine, check: TimeCheck | undefined, deviceAt: number): TimeCheck | undefined {
  if (!check || Math.abs(check.deviceAt - deviceAt) > CHECK_REACH_MS) return undefined;
  const early = Math.min(check.deviceAt, deviceAt);
  const late = Math.max(check.deviceAt, deviceAt);
  // A step belongs to the time after it: what carries the same instant was made on the new clock.
  const stepAt = line.stepsAt[firstAfter(line.stepsAt, early, (at) => at)];
  return stepAt !== undefined && stepAt <= late ? undefined : check;
}

/** Index of the first item whose time is later than `atMs`; `items` are sorted by time. */
function firstAfter<T>(items: readonly T[], atMs: number, timeOf: (item: T) => number): number {
  let low = 0;
  let high = items.length;
  while (low < high) {
    const middle = (low + high) >>> 1;
    if (timeOf(items[middle]!) > atMs) high = middle;
    else low = middle + 1;
  }
  return low;
}

/** Of checks at one instant the most certain stands first; the offset breaks the last tie, so input order never counts. */
function byTimeThenTrust(a: TimeCheck, b: TimeCheck): number {
  return a.deviceAt - b.deviceAt || a.uncertaintyMs - b.uncertaintyMs || a.offsetMs - b.offsetMs;
}

function corrected(deviceAt: number, basis: TimeBasis, offsetMs: number): CorrectedTime {
  const whole = Math.round(offsetMs);
  return { atMs: deviceAt + whole, basis, offsetMs: whole };
}

function unchecked(deviceAt: number): CorrectedTime {
  return { atMs: deviceAt, basis: 'unchecked', offsetMs: 0 };
}
