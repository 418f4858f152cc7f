import type { PauseReason } from '../platform/sending';

/** When the next round is due. Network and visibility only ask for a round; the pacing decides. */
export type RoundEnd =
  { kind: 'done'; more: boolean } | { kind: 'paused'; reason: PauseReason; retryAfterMs?: number };

const AFTER_WRITE_MS = 1500;
const IDLE_MS = 60_000;
const BUSY_MS = 5_000;
const BACK_OFF_MS_MIN = 5_000;
const BACK_OFF_MS_MAX = 300_000;

/**
 * Milliseconds until the next round, or null where only the person (a sign-in, an update of the app) can make
 * one useful. `failures` counts pauses in a row; `jitter` is 0…1 and spreads phones that return together.
 */
export function nextRoundDelayMs(end: RoundEnd, failures: number, jitter: number): number | null {
  if (end.kind === 'done') return end.more ? 0 : IDLE_MS;
  switch (end.reason) {
    case 'signed-out':
    case 'protocol-too-old':
      return null;
    case 'busy':
      return BUSY_MS;
    case 'throttled':
      return (end.retryAfterMs ?? BACK_OFF_MS_MIN) * (1 + jitter / 2);
    default:
      return (
        Math.min(BACK_OFF_MS_MAX, BACK_OFF_MS_MIN * 2 ** Math.min(failures - 1, 10)) * (0.5 + jitter / 2)
      );
  }
}

export function afterWriteDelayMs(): number {
  return AFTER_WRITE_MS;
}
