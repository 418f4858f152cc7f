import { useSecond } from '../../platform/tick';
import { utcTime } from '../../platform/utc-text';
import './clock.css';

type UtcClockProps = {
  /** Ms that the device is ahead of UTC by its clock check (negative: behind); the clock shows the corrected time. */
  readonly aheadMs?: number;
};

/** The large UTC clock. Steps on the full second and rests while the screen is off. */
export function UtcClock({ aheadMs = 0 }: UtcClockProps) {
  const atMs = useSecond(aheadMs);
  return (
    <time className="hm-clock num" dateTime={new Date(atMs).toISOString().slice(0, 19) + 'Z'}>
      {utcTime(atMs)}
      <span className="only-heard"> UTC</span>
    </time>
  );
}
