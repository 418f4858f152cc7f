import { ProgressBar } from '../../../design/figure/ProgressBar';
import type { RunningField } from '../use-running-field';
import { othersSee } from '../words';
import { LockKey } from './LockKey';
import './outing-head.css';

/** Where the outing is and what others see of it, with the rain lock beside it. */
export function SiteLine({ field, onLock }: { readonly field: RunningField; readonly onLock: () => void }) {
  const { site } = field.frame;
  return (
    <div className="fd-site">
      <p>
        <b>{site?.fields.name ?? 'Site not on this phone'}</b>
        {site ? <span> · others see {othersSee(site.fields.place)}</span> : null}
      </p>
      <LockKey onLock={onLock} />
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
