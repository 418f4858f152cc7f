import { useState } from 'react';
import { Button } from '../../design/button/Button';
import { answerWords } from '../../platform/api/answer-words';
import { utcDateTime } from '../../platform/utc-text';
import { makeJoinCode, type JoinCode, type People } from './data/use-people';

import './desk.css';

/** Makes the club's join code and shows it once. */
export function JoinCodePart({ log }: { readonly log: People['log'] }) {
  const [made, setMade] = useState<JoinCode | null>(null);
  const [trouble, setTrouble] = useState<string | null>(null);
  const [isBusy, setBusy] = useState(false);

  async function make(): Promise<void> {
    setBusy(true);
    const answer = await makeJoinCode(log);
    setBusy(false);
    setTrouble(answer.kind === 'ok' ? null : answerWords(answer));
    if (answer.kind === 'ok') setMade(answer.body);
  }
  return (
    <>
      <p>Whoever has the code joins as a member. A new code ends the one before.</p>
      {made ? (
        <p role="status">
          <span className="desk-code num">{made.code}</span>
          <br />
          works until {utcDateTime(made.expiresAt)}, up to {made.usesLeft} times. It is shown this once: write
          it down.
        </p>
      ) : null}
      {trouble ? <p role="alert">{trouble}</p> : null}
      <Button look="outline" busy={isBusy} onClick={() => void make()}>
        Make a new code
      </Button>
    </>
  );
}
