import { frequencyText } from '@harkmoor/sync-model/radio/bands/frequency-text';
import { NoticeLine } from '../../../design/notice/NoticeLine';
import { utcHourMinute } from '../../../platform/utc-text';
import type { LastAct } from '../data/last-act';
import { outcomeWords } from '../words';

/** What was done last, with *Undo*: it stays until the next entry. */
export function ActLine({
  act,
  onUndo,
}: {
  readonly act: LastAct | null;
  readonly onUndo: (act: LastAct) => void;
}) {
  if (act === null) return <NoticeLine text={null} />;
  return (
    <NoticeLine
      text={<span className="num">{actWords(act)}</span>}
      actionLabel={act.kind === 'binned' ? 'Put back' : 'Undo'}
      onAction={() => onUndo(act)}
    />
  );
}

function actWords(act: LastAct): string {
  if (act.kind === 'mended') {
    const count = act.mend.replaced.length;
    return count === 1 ? '1 entry changed' : `${count} entries changed`;
  }
  const { fields } = act.entry;
  const what = `${outcomeWords(fields)}, ${frequencyText(fields.tuning.dialHz)}, ${utcHourMinute(fields.deviceAt)}`;
  if (act.kind === 'edited') return `Changed: ${what}`;
  return act.kind === 'binned' ? `In the bin: ${what}` : what;
}
