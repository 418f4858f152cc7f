import { frequencyText } from '@harkmoor/sync-model/radio/bands/frequency-text';
import { Button } from '../../../design/button/Button';
import { RowLink } from '../../../design/layout/RowLink';
import { Section } from '../../../design/layout/Section';
import { paths } from '../../../platform/paths';
import { utcDateTime } from '../../../platform/utc-text';
import type { ReceptionLine } from '../answers/questions';
import { counted } from '../view/scope-words';

type ReceptionsBehindProps = {
  readonly lines: readonly ReceptionLine[];
  readonly n: number;
  readonly onMore: () => void;
};

/** The receptions that the figure was made from, newest first. */
export function ReceptionsBehind({ lines, n, onMore }: ReceptionsBehindProps) {
  return (
    <Section title="Receptions behind it" aside={<span className="soft num">{counted(n, 'reception')}</span>}>
      {lines.map((line) => (
        <ReceptionRow key={line.receptionId} line={line} />
      ))}
      {lines.length < n ? (
        <Button look="outline" onClick={onMore}>
          Show more
        </Button>
      ) : null}
    </Section>
  );
}

/** One reception as a line that opens it in the logbook. */
export function ReceptionRow({ line }: { readonly line: ReceptionLine }) {
  const about = [line.targetName, line.siteName, line.antennaName].filter(Boolean).join(' · ');
  return (
    <RowLink
      to={paths.reception(line.receptionId)}
      name={<span className="num">{frequencyText(line.frequencyHz)}</span>}
      note={
        <span className="num">
          {utcDateTime(line.atMs)} · {about}
          {line.isInReview ? ' · in review' : ''}
        </span>
      }
      aside={<b className="num">{outcomeWords(line)}</b>}
    />
  );
}

function outcomeWords({ heard, o }: ReceptionLine): string {
  if (!heard) return 'Nil';
  return o === null ? 'Heard' : `Heard, O ${o}`;
}
