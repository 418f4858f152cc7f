import { CHECK_REACH_MS, type TimeCheck } from './corrected-time.js';

/** What may be said of a device's clock at this moment. */
export type ClockTrust =
  | { kind: 'checked'; check: TimeCheck; ageMs: number }
  /** The newest check is more than 12 h away: it says nothing about entries made now. */
  | { kind: 'old'; check: TimeCheck; ageMs: number }
  /** The clock jumped after the newest check. */
  | { kind: 'stepped'; stepAt: number; stepMs: number }
  | { kind: 'unchecked' };

/**
 * The state of one device's clock from its own checks and the jumps seen on it, at `nowMs` of that clock. A step
 * belongs to the time after it, so a check at the very instant of a step was made on the new clock.
 */
export function clockTrust(
  checks: readonly TimeCheck[],
  steps: readonly { at: number; stepMs: number }[],
  nowMs: number,
): ClockTrust {
  const check = latest(
    checks.filter(({ deleted }) => !deleted),
    (one) => one.deviceAt,
  );
  const step = latest(steps, (one) => one.at);
  if (step && nowMs - step.at <= CHECK_REACH_MS && (!check || step.at > check.deviceAt)) {
    return { kind: 'stepped', stepAt: step.at, stepMs: step.stepMs };
  }
  if (!check) return { kind: 'unchecked' };
  const ageMs = Math.abs(nowMs - check.deviceAt);
  return { kind: ageMs > CHECK_REACH_MS ? 'old' : 'checked', check, ageMs };
}

function latest<T>(items: readonly T[], timeOf: (item: T) => number): T | undefined {
  return items.reduce<T | undefined>(
    (best, item) => (best === undefined || timeOf(item) > timeOf(best) ? item : best),
    undefined,
  );
}
