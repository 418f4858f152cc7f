import type { Outing } from './outing.js';

/** No entry for so long: at the next opening the phone proposes to end the outing at its last entry. */
export const FORGOTTEN_AFTER_MS = 4 * 3_600_000;

/**
 * When a running outing should have ended, ms UTC by the device clock, or null while it is alive. An outing
 * without any entry ended when it began.
 */
export function forgottenSince(
  outing: Pick<Outing, 'startedAt' | 'ended'>,
  entryTimesMs: readonly number[],
  nowMs: number,
): number | null {
  if (outing.ended) return null;
  const lastMs = entryTimesMs.reduce((latest, at) => Math.max(latest, at), outing.startedAt);
  return nowMs - lastMs >= FORGOTTEN_AFTER_MS ? lastMs : null;
}
