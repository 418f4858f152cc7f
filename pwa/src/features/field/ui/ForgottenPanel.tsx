import { useState } from 'react';
import { Button } from '../../../design/button/Button';
import { durationWords, timeOrDate } from '../../../platform/utc-text';

type ForgottenPanelProps = {
  readonly endedAt: number;
  readonly nowMs: number;
  readonly onEnd: (atMs: number) => void;
};

/** Four hours without an entry: proposes to end the outing where its last entry stands. */
export function ForgottenPanel({ endedAt, nowMs, onEnd }: ForgottenPanelProps) {
  const [goesOn, setGoesOn] = useState(false);
  if (goesOn) return null;
  const at = timeOrDate(endedAt, nowMs);
  return (
    <section className="fd-forgotten" aria-labelledby="fd-forgotten">
      <h2 id="fd-forgotten">Is this outing over?</h2>
      <p className="num">
        Nothing was entered for {durationWords(nowMs - endedAt)}. The last entry stands at {at} UTC.
      </p>
      <div className="fd-two">
        <Button onClick={() => onEnd(endedAt)}>End it at {at}</Button>
        <Button look="outline" onClick={() => setGoesOn(true)}>
          It goes on
        </Button>
      </div>
    </section>
  );
}
