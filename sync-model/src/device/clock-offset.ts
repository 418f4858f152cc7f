import type { StoreTransaction } from './ports.js';

/** Name of the setting that holds what is to be added to the device clock, in ms. */
export const CLOCK_OFFSET_SETTING = 'clockOffsetMs';
/** Below this, what a round trip takes cannot be told from a wrong clock. */
const OFFSET_NOTICED_MS = 60_000;

/**
 * Keeps the offset that the server's time tells, where it differs noticeably from the one that is kept. Also
 * forgets it when the device clock has been set right, for a stale offset is itself a wrong clock.
 */
export async function learnClockOffset(
  tx: StoreTransaction,
  serverTimeMs: number,
  deviceNowMs: number,
): Promise<void> {
  const kept = (await tx.setting<number>(CLOCK_OFFSET_SETTING)) ?? 0;
  const told = serverTimeMs - deviceNowMs;
  const offset = Math.abs(told) < OFFSET_NOTICED_MS ? 0 : told;
  if (Math.abs(offset - kept) >= OFFSET_NOTICED_MS || (offset === 0 && kept !== 0)) {
    await tx.putSetting(CLOCK_OFFSET_SETTING, offset);
  }
}
