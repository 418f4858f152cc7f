import type { Reception } from '@harkmoor/sync-model/records/reception';
import { utcTime } from '../../../platform/utc-text';

type TimeMendProps = {
  readonly outcome: Reception['outcome'];
  readonly atMs: number;
  /** When it was tapped, or what the entry holds: the way back. */
  readonly tappedMs: number;
  readonly onTime: (atMs: number) => void;
};

const MINUTE_MS = 60_000;
const WORDS = { heard: 'Heard at', nil: 'Nil at', skipped: 'Skipped at' } as const;

/** The tap came late: one minute or five earlier, and back again. */
export function TimeMend({ outcome, atMs, tappedMs, onTime }: TimeMendProps) {
  return (
    <div className="fd-time" role="group" aria-label="Time of the entry">
      <span className="num" role="status">
        {WORDS[outcome]} <b>{utcTime(atMs)}</b> UTC
      </span>
      <button type="button" onClick={() => onTime(atMs - MINUTE_MS)}>
        −1 min<span className="only-heard"> earlier</span>
      </button>
      <button type="button" onClick={() => onTime(atMs - 5 * MINUTE_MS)}>
        −5 min<span className="only-heard"> earlier</span>
      </button>
      {atMs === tappedMs ? null : (
        <button type="button" onClick={() => onTime(tappedMs)}>
          As it was
        </button>
      )}
    </div>
  );
}
