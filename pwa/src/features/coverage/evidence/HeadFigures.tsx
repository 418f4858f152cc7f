import { NO_RATE_WORDS } from '@harkmoor/sync-model/evidence/heard-rate';
import { Figure, FigureRow } from '../../../design/figure/Figure';
import { figureText, withUnit } from '../../../platform/utc-text';
import type { EvidenceAnswer } from '../answers/questions';
import { distributionWords, intervalWords, sampleWords, scoreFigure } from '../view/figure-words';
import { counted, percentWords } from '../view/scope-words';

/** Heard rate and typical score with what they were made from, and what to keep in mind. */
export function HeadFigures({ answer }: { readonly answer: EvidenceAnswer }) {
  const { rate, score, scoresBeside } = answer;
  return (
    <div className="cov-figures">
      <FigureRow>
        <Figure
          value={rate.rate === null ? '–' : percentWords(rate.rate)}
          label="heard"
          interval={intervalWords(rate)}
          sample={sampleWords(rate)}
          thin={rate.isThin}
        />
        <Figure
          value={scoreFigure(score)}
          label="typical score"
          interval={score.interval ? `95 % ${score.interval.low}–${score.interval.high}` : undefined}
          sample={score.n === 0 ? 'none scored' : distributionWords(score)}
          thin={score.n > 0 && score.n < 5}
        />
      </FigureRow>
      {rate.rate === null && rate.n > 0 ? <p className="small">{NO_RATE_WORDS[rate.reason]}</p> : null}
      <ul className="cov-facts soft num">
        {facts(answer).map((fact) => (
          <li key={fact}>{fact}</li>
        ))}
        {scoresBeside.n > 0 ? (
          <li>
            Beside it, from chance, swaps and imports: {scoreFigure(scoresBeside)},{' '}
            {distributionWords(scoresBeside)}
          </li>
        ) : null}
      </ul>
    </div>
  );
}

function facts({ rate, score, levels, inReview, uncheckedTimes }: EvidenceAnswer): string[] {
  return [
    rate.rate !== null && rate.hours > 1
      ? `Mean of ${rate.hours} hours; the interval goes by the ${counted(rate.dates, 'date')}.`
      : null,
    score.unscored > 0 ? `${counted(score.unscored, 'heard one')} without an overall score.` : null,
    ...levels.map(levelWords),
    inReview > 0 ? `${counted(inReview, 'observation')} in review: counted and marked.` : null,
    uncheckedTimes > 0 ? `${counted(uncheckedTimes, 'time')} no clock check reaches.` : null,
  ].filter((fact) => fact !== null);
}

function levelWords({ receiverName, level, interval, n, nils }: EvidenceAnswer['levels'][number]): string {
  const sample = `${counted(n, 'try').replace('trys', 'tries')}, ${figureText(nils)} nil`;
  if (level.kind === 'below-floor') {
    const floor = level.floorDbm === null ? 'below what was read' : `< ${withUnit(level.floorDbm, 'dBm')}`;
    return `Level at ${receiverName}: ${floor}, ${sample}.`;
  }
  const range =
    interval?.lowDbm != null && interval.highDbm !== null
      ? `, 95 % ${figureText(interval.lowDbm)} to ${figureText(interval.highDbm)}`
      : '';
  return `Level at ${receiverName}: ${withUnit(level.medianDbm, 'dBm')}${range}, ${sample}.`;
}
