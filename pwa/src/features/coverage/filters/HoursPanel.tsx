import { Link } from 'react-router-dom';
import { RampLegend } from '../../../design/charts/RampLegend';
import type { RimPart } from '../../../design/charts/DialRim';
import { paths } from '../../../platform/paths';
import { shortDate, utcHourMinute } from '../../../platform/utc-text';
import type { Overview } from '../answers/questions';
import { viewQuery, type CoverageView, type Measure } from '../view/coverage-view';
import type { ChangeView } from '../view/use-coverage-view';
import { rangeWords } from '../view/hour-range';
import { amountWords, datesWords } from '../view/scope-words';
import { figureText } from '../../../platform/utc-text';
import { HoursTrack } from './HoursTrack';

type HoursPanelProps = {
  readonly view: CoverageView;
  readonly overview: Overview;
  readonly onChange: ChangeView;
  readonly onOpenHours: () => void;
  readonly nightAtMs: number | null;
  readonly sun: readonly RimPart[];
  readonly amount: { readonly observations: number; readonly squares: number; readonly largestN: number };
};

/** Over the foot of the map: the hours, for when night is drawn, what the colours mean and how much stands behind. */
export function HoursPanel(props: HoursPanelProps) {
  const { view, overview, onChange, nightAtMs, amount } = props;
  return (
    <section className="cov-panel cov-hours" aria-label="Hours and key">
      <div className="cov-hours-head num">
        <button type="button" onClick={props.onOpenHours} aria-haspopup="dialog">
          {rangeWords(view.hours)}
        </button>
        <span className="cov-hours-note">
          {datesWords(view, overview)} · {nightWords(nightAtMs)}
        </span>
      </div>
      <HoursTrack range={view.hours} sun={props.sun} onChange={(hours) => onChange({ hours })} />
      <RampLegend {...legendEnds(view.measure, amount.largestN)} />
      <div className="cov-hours-foot num">
        <span role="status">{amountWords(amount.observations, amount.squares)}</span>
        <Link to={paths.coverageTable(viewQuery({ ...view, square: null }))}>As a table</Link>
      </div>
    </section>
  );
}

/** "night at 15:30, 31 Dec": for when the shade on the map is drawn. */
export function nightWords(nightAtMs: number | null): string {
  return nightAtMs === null
    ? 'no night drawn'
    : `night at ${utcHourMinute(nightAtMs)}, ${shortDate(nightAtMs)}`;
}

function legendEnds(measure: Measure, largestN: number): { from: string; to: string } {
  if (measure === 'rate') return { from: '0 %', to: '100 % heard' };
  if (measure === 'score') return { from: 'O 1', to: 'O 5' };
  return { from: '1', to: `${figureText(Math.max(1, largestN))} observations` };
}
