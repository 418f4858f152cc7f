/** The device's time of day, ms UTC. It may be wrong: entries keep it raw beside the clock check. */
export function nowMs(): number {
  return Date.now();
}

/** Ms since some start, never set back and never stepped. Meaningless across reloads. */
export function monotonicMs(): number {
  return performance.now();
}

/** A jump of the device clock against the monotonic one. */
export type ClockStep = { readonly atMs: number; readonly stepMs: number };

/** Below this, drift and late timers explain a difference. */
const STEP_LIMIT_MS = 2000;

/**
 * Notices when the device clock was set: between two looks, wall time and monotonic time must agree. A sleep of the
 * device can stop the monotonic clock, so a step forward found right after one proves nothing: `afterSleep` says so.
 */
export function createStepDetector(wall: () => number = nowMs, steady: () => number = monotonicMs) {
  let last = { wallMs: wall(), steadyMs: steady() };
  return {
    /** The step since the last look, or null. */
    look(afterSleep = false): ClockStep | null {
      const next = { wallMs: wall(), steadyMs: steady() };
      const stepMs = next.wallMs - last.wallMs - (next.steadyMs - last.steadyMs);
      last = next;
      if (Math.abs(stepMs) < STEP_LIMIT_MS) return null;
      if (afterSleep && stepMs > 0) return null;
      return { atMs: next.wallMs, stepMs };
    },
  };
}
