import { useState } from 'react';
import type { ClockTrust } from '@harkmoor/sync-model/evidence/clock-trust';
import { nearestMinute, toneCheck } from '@harkmoor/sync-model/evidence/tone-check';
import { Button } from '../../../design/button/Button';
import { Sheet } from '../../../design/sheet/Sheet';
import { readServerTime } from '../../../platform/server-time';
import { utcHourMinute, withUnit } from '../../../platform/utc-text';
import { useFieldActions } from '../data/use-field-actions';
import { useAct } from '../use-act';
import { aheadWords, clockWords } from '../words';
import './clock-sheet.css';

type ClockSheetProps = { readonly trust: ClockTrust; readonly nowMs: number; readonly onClose: () => void };

/** Checks the device clock against a time signal by ear, or against the server where there is signal. */
export function ClockSheet({ trust, nowMs, onClose }: ClockSheetProps) {
  const { text } = clockWords(trust, nowMs);
  return (
    <Sheet isOpen title="Check the clock" onClose={onClose}>
      <p className="num">
        Device time · {text}. Entries keep the device’s own time; the check corrects what is shown.
      </p>
      <ToneCheckPart onDone={onClose} />
      <ServerCheckPart onDone={onClose} />
    </Sheet>
  );
}

function ToneCheckPart({ onDone }: { readonly onDone: () => void }) {
  const actions = useFieldActions();
  const act = useAct();
  const [taps, setTaps] = useState<number[]>([]);
  const [shift, setShift] = useState(0);
  const last = taps.at(-1);
  const check = last === undefined ? null : toneCheck(taps, shift);
  const save = async (): Promise<void> => {
    if (!check) return;
    if (await act(() => actions.saveClockCheck({ ...check, method: 'tone', pathKm: null }))) onDone();
  };
  return (
    <section>
      <h3 className="fd-sheet-head">By a time signal</h3>
      <p>Tune to a time station. Tap exactly with the pip at the full minute; three minutes make it surer.</p>
      <button
        type="button"
        className="fd-pip"
        onPointerDown={() => setTaps((all) => [...all, Date.now()])}
        onKeyDown={(event) => {
          if ((event.key === ' ' || event.key === 'Enter') && !event.repeat)
            setTaps((all) => [...all, Date.now()]);
        }}
      >
        Tap at the minute pip
      </button>
      {check && last !== undefined ? (
        <>
          <p className="num" role="status">
            {taps.length === 1 ? '1 tap' : `${taps.length} taps`}: the pip was{' '}
            {utcHourMinute(nearestMinute(last) + shift * 60_000)} UTC, so this device is{' '}
            {aheadWords(check.offsetMs)}, give or take {withUnit(check.uncertaintyMs / 1000, 's', 1)}.
          </p>
          <div className="fd-two">
            <Button look="outline" onClick={() => setShift(shift - 1)}>
              A minute earlier
            </Button>
            <Button look="outline" onClick={() => setShift(shift + 1)}>
              A minute later
            </Button>
            <Button look="outline" onClick={() => setTaps([])}>
              Tap anew
            </Button>
            <Button onClick={() => void save()}>Save this check</Button>
          </div>
        </>
      ) : null}
    </section>
  );
}

function ServerCheckPart({ onDone }: { readonly onDone: () => void }) {
  const actions = useFieldActions();
  const act = useAct();
  const [state, setState] = useState<'idle' | 'asking' | 'unreachable'>('idle');
  const ask = async (): Promise<void> => {
    setState('asking');
    const answer = await readServerTime();
    if (answer === null) return setState('unreachable');
    setState('idle');
    if (await act(() => actions.saveClockCheck({ ...answer, method: 'server', pathKm: null }))) onDone();
  };
  return (
    <section>
      <h3 className="fd-sheet-head">By the server</h3>
      <p role="status">
        {state === 'unreachable'
          ? 'No answer from the server. With no signal, use a time station.'
          : 'Needs signal. Sure to about a second.'}
      </p>
      <Button look="outline" busy={state === 'asking'} onClick={() => void ask()}>
        Ask the server
      </Button>
    </section>
  );
}
