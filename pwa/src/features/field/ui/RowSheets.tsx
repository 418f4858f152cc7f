import type { OnAirState } from '@harkmoor/sync-model/evidence/schedule';
import { frequencyText } from '@harkmoor/sync-model/radio/bands/frequency-text';
import type { NilReason } from '@harkmoor/sync-model/records/reception-from-tap';
import { NIL_REASONS_IN_ORDER } from '../nil-reasons';
import { Button } from '../../../design/button/Button';
import { Sheet } from '../../../design/sheet/Sheet';
import { utcHourMinute } from '../../../platform/utc-text';
import type { StoredTarget } from '../data/outing-frame';
import type { RowQuestion } from '../use-row-acts';
import { NIL_REASON_WORDS, offAirWords, onAirWords } from '../words';

type RowSheetsProps = {
  readonly question: RowQuestion | null;
  readonly onAir: (target: StoredTarget) => OnAirState;
  readonly nowMs: number;
  readonly isAnswered: (target: StoredTarget) => boolean;
  readonly onNil: (target: StoredTarget, reason: NilReason, atMs: number) => void;
  readonly onSkip: (target: StoredTarget) => void;
  readonly onHeard: (target: StoredTarget) => void;
  readonly onClose: () => void;
};

/** The sheets of a row: why it was not heard (long press on Nil), and everything else that can be said of it. */
export function RowSheets(props: RowSheetsProps) {
  const { question, onClose } = props;
  const then = (act: () => void) => (): void => {
    onClose();
    act();
  };
  if (question === null) return null;
  const { target } = question;
  const name = `${frequencyText(target.fields.frequencyHz)} · ${target.fields.name}`;
  const reasons = (atMs: () => number) =>
    NIL_REASONS_IN_ORDER.map((reason) => (
      <Button key={reason} look="outline" onClick={then(() => props.onNil(target, reason, atMs()))}>
        {NIL_REASON_WORDS[reason]}
      </Button>
    ));
  if (question.kind === 'nil-reason') {
    const at = utcHourMinute(question.atMs);
    return (
      <Sheet isOpen title={`Nil at ${at} UTC: why?`} onClose={onClose}>
        <p className="soft num">{name}</p>
        <div className="fd-sheet-list">{reasons(() => question.atMs)}</div>
      </Sheet>
    );
  }
  return (
    <Sheet isOpen title={name} onClose={onClose}>
      <TargetFacts target={target} onAir={props.onAir(target)} nowMs={props.nowMs} />
      <div className="fd-sheet-list">
        <Button onClick={then(() => props.onHeard(target))}>
          {props.isAnswered(target) ? 'Heard once more' : 'Heard'}
        </Button>
        {props.isAnswered(target) ? null : (
          <Button look="outline" onClick={then(() => props.onSkip(target))}>
            Skip it in this round
          </Button>
        )}
      </div>
      <h3 className="fd-sheet-head">Nil, because of</h3>
      <div className="fd-sheet-list">{reasons(Date.now)}</div>
    </Sheet>
  );
}

function TargetFacts({ target, onAir, nowMs }: { target: StoredTarget; onAir: OnAirState; nowMs: number }) {
  const { mode, language, powerKw, note, schedule } = target.fields;
  const times =
    schedule === 'always'
      ? 'always on air'
      : schedule.map(({ from, to }) => `${from}–${to}`).join(', ') + ' UTC';
  const state = onAir.kind === 'on' ? onAirWords(onAir) : offAirWords(onAir, nowMs);
  const facts = [mode, language, powerKw === null ? null : `${powerKw}\u202fkW`, times, state];
  return (
    <>
      <p className="soft num">{facts.filter(Boolean).join(' · ')}</p>
      {note ? <p>{note}</p> : null}
    </>
  );
}
