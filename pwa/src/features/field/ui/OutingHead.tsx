import { ProgressBar } from '../../../design/figure/ProgressBar';
import type { RunningField } from '../use-running-field';
import { othersSee } from '../words';

/** Where the outing is and what others see of it, with the rain lock beside it. */
export function SiteLine({ field, onLock }: { readonly field: RunningField; readonly onLock: () => void }) {
  const { site } = field.frame;
  return (
    <div className="fd-site">
      <p>
        <b>{site?.fields.name ?? 'Site not on this phone'}</b>
        {site ? <span> · others see {othersSee(site.fields.place)}</span> : null}
      </p>
      <button type="button" className="fd-lock" onClick={onLock} aria-label="Lock the screen against rain">
        <svg width="18" height="20" viewBox="0 0 18 20" aria-hidden="true">
          <path
            d="M4.5 9V6a4.500 4.500 0 0 1 9 0v3M2.500 9h13v9.500h-13z"
            fill="none"
            stroke="currentColor"
            strokeWidth="2"
            strokeLinejoin="round"
          />
        </svg>
        Lock
      </button>
    </div>
  );
}

export function RoundHead({ field }: { readonly field: RunningField }) {
  const { round, roundNo, frame } = field;
  return (
    <div className="fd-round">
      <div className="fd-round-words num">
        <h2>
          Round {roundNo} · {frame.list?.fields.name ?? 'list not on this phone'}
        </h2>
        <span>
          {round.answered} of {round.total}
        </span>
      </div>
      <ProgressBar label={`Round ${roundNo}`} done={round.answered} total={round.total} />
    </div>
  );
}
