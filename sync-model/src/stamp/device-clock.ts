import { nextStamp, STAMP_AHEAD_MS_MAX, stampWallMs, type Stamp } from './stamp.js';

/** Where a device's stamps come from; wall time and the known offset are supplied by the host. */
export type DeviceClock = {
  readonly deviceId: string;
  /** Device wall time plus the offset that a server has told, in ms UTC. */
  nowMs(): number;
};

/**
 * Makes stamps that do not run backwards on one device: each is later than the stamps of the values that the
 * edit replaces, always, and than the last one made here, unless the clock has gone back by more than five
 * minutes. Then it has been set right, and the old stamps, which no server would take, hold nobody back.
 */
export function createStamper(clock: DeviceClock): (replaced?: readonly (Stamp | undefined)[]) => Stamp {
  let last: Stamp | undefined;
  return (replaced = []) => {
    const nowMs = clock.nowMs();
    if (last !== undefined && stampWallMs(last) > nowMs + STAMP_AHEAD_MS_MAX) last = undefined;
    last = nextStamp(clock.deviceId, nowMs, [last, ...replaced]);
    return last;
  };
}
