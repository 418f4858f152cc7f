import { Section } from '../../../design/layout/Section';
import { figureText } from '../../../platform/utc-text';
import type { EvidenceAnswer } from '../answers/questions';
import { ReceptionRow } from './ReceptionsBehind';

/** What is not in the figure, with the reason and the receptions. */
export function LeftOutList({ leftOut }: Pick<EvidenceAnswer, 'leftOut'>) {
  return (
    <Section title="Left out">
      {leftOut.length === 0 ? <p className="soft">Nothing: every reception here counts.</p> : null}
      {leftOut.map(({ reason, words, count, lines }) => (
        <details key={reason} className="cov-left-out">
          <summary className="num">
            <b>{figureText(count)}</b>
            <span>{words}</span>
          </summary>
          {lines.map((line) => (
            <ReceptionRow key={line.receptionId} line={line} />
          ))}
          {count > lines.length ? (
            <p className="small soft num">
              The newest {figureText(lines.length)} of {figureText(count)}.
            </p>
          ) : null}
        </details>
      ))}
    </Section>
  );
}
