import type { Stamp } from '../stamp/stamp.js';
import { CHECK_REACH_MS, type TimeCheck } from './corrected-time.js';

/** What may be said of a device's clock at this moment. */
export type ClockTrust =
  | { kind: 'checked'; check: TimeCheck; ageMs: number }
  /** The newest check is more than 12 h away: it says nothing about entries made now. */
  | { kind: 'old'; check: TimeCheck; ageMs: number }
  /** The clock jumped after the newest check. */
  | { kind: 'stepped'; stepAt: number; stepMs: number }
  | { kind: 'unchecked' };

/** A check with the stamp of its writing, which tells before from after even when the clock was put back. */
export type StampedCheck = TimeCheck & { readonly stamp?: Stamp };

/**
 * The state of one device's clock from its own checks and the jumps seen on it, in the order in which they were seen,
 * at `nowMs` of that clock. A step belongs to the time after it, so a check at the very instant of a step was made on
 * the new clock. A clock that was put back shows some minutes twice: where stamps are given (`stepsStamp` is that of
 * the last step), they say what came first, for stamps of one device never run back.
 */
export function clockTrust(
  checks: readonly StampedCheck[],
  steps: readonly { at: number; stepMs: number }[],
  nowMs: number,
  stepsStamp?: Stamp,
): ClockTrust {
  const check = newest(checks.filter(({ deleted }) => !deleted));
  const step = steps.at(-1);
  const isCheckedSince =
    step && check && (stepsStamp && check.stamp ? check.stamp > stepsStamp : check.deviceAt >= step.at);
  if (step && !isCheckedSince && nowMs - step.at <= CHECK_REACH_MS) {
    return { kind: 'stepped', stepAt: step.at, stepMs: step.stepMs };
  }
  if (!check) return { kind: 'unchecked' };
  const ageMs = Math.abs(nowMs - check.deviceAt);
  return { kind: ageMs > CHECK_REACH_MS ? 'old' : 'checked', check, ageMs };
}

function newest(checks: readonly StampedCheck[]): StampedCheck | undefined {
  return checks.reduce<StampedCheck | undefined>(
    (best, check) => (best === undefined || isNewer(check, best) ? check : best),
    undefined,
  );
}

function isNewer(a: StampedCheck, b: StampedCheck): boolean {
  return a.stamp && b.stamp ? a.stamp > b.stamp : a.deviceAt > b.deviceAt;
}
