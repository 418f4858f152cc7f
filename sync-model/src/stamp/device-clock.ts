import { nextStamp, type Stamp } from './stamp.js';

/** Where a device's stamps come from; wall time and the known offset are supplied by the host. */
export type DeviceClock = {
  readonly deviceId: string;
  /** Device wall time plus the offset that a server has told, in ms UTC. */
  nowMs(): number;
};

/**
 * Makes stamps that never run backwards on one device: each is later than the last one made here and than
 * the stamps of the values that the edit replaces.
 */
export function createStamper(clock: DeviceClock): (replaced?: readonly (Stamp | undefined)[]) => Stamp {
  let last: Stamp | undefined;
  return (replaced = []) => {
    last = nextStamp(clock.deviceId, clock.nowMs(), [last, ...replaced]);
    return last;
  };
}
