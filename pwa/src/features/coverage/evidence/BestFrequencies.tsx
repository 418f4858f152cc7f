import type { FrequencyChoice } from '@harkmoor/sync-model/evidence/pick-frequency';
import { useState } from 'react';
import { Button } from '../../../design/button/Button';
import { Section } from '../../../design/layout/Section';
import { THIN_SPACE } from '../../../platform/utc-text';
import { channelWords } from '../view/channel-words';
import type { CoverageView } from '../view/coverage-view';
import { isAllHours, shortRangeWords } from '../view/hour-range';
import { counted, percentWords } from '../view/scope-words';

type BestFrequenciesProps = {
  readonly choices: readonly FrequencyChoice[];
  readonly view: CoverageView;
  readonly onChoose: (channelKey: string) => void;
};

const SHOWN_AT_FIRST = 6;

/** *Pick a frequency*: ranked by what each hour needed has shown at the least. */
export function BestFrequencies({ choices, view, onChoose }: BestFrequenciesProps) {
  const [isWhole, setWhole] = useState(false);
  const shown = isWhole ? choices : choices.slice(0, SHOWN_AT_FIRST);
  const title = `Pick a frequency, ${shortRangeWords(view.hours)}`;
  return (
    <Section title={title}>
      {choices.length === 0 ? (
        <p className="soft">Nothing was tried in these hours.</p>
      ) : (
        <div className="hm-table-scroll" role="region" aria-label="Frequencies, ranked" tabIndex={0}>
          <table className="hm-table">
            <thead>
              <tr>
                <th scope="col">frequency</th>
                <th scope="col" className="hm-figures">
                  heard
                </th>
                <th scope="col" className="hm-figures">
                  at least
                </th>
                <th scope="col" className="hm-figures">
                  weakest
                </th>
              </tr>
            </thead>
            <tbody>
              {shown.map((choice) => (
                <ChoiceRow key={choice.channelKey} choice={choice} onChoose={onChoose} />
              ))}
            </tbody>
          </table>
        </div>
      )}
      {choices.length > shown.length ? (
        <Button look="quiet" onClick={() => setWhole(true)}>
          All {choices.length} frequencies
        </Button>
      ) : null}
      <p className="small soft">
        At least: the mean of the lower 95 % bounds of the hours needed; an hour without a try counts as 0.
        {isAllHours(view.hours) ? ' Choose the hours that you need to narrow it.' : ''}
      </p>
    </Section>
  );
}

type ChoiceRowProps = { readonly choice: FrequencyChoice; readonly onChoose: (channelKey: string) => void };

function ChoiceRow({ choice, onChoose }: ChoiceRowProps) {
  const { channelKey, heard, atLeast, weakestHour, emptyHoursUtc } = choice;
  const empty = emptyHoursUtc.length === 0 ? '' : ` · ${counted(emptyHoursUtc.length, 'hour')} empty`;
  return (
    <tr>
      <td className="num">
        <button type="button" className="cov-pick" onClick={() => onChoose(channelKey)}>
          {channelWords(channelKey)}
        </button>
        <span className="cov-pick-sample">
          {counted(heard.n, 'try').replace('trys', 'tries')} on {counted(heard.dates, 'date')}
          {empty}
          {heard.isThin ? ' · thin' : ''}
        </span>
      </td>
      <td className="num hm-figures">{heard.rate === null ? '–' : percentWords(heard.rate)}</td>
      <td className="num hm-figures">
        <b>{percentWords(atLeast)}</b>
      </td>
      <td className="num hm-figures">
        {String(weakestHour.hourUtc).padStart(2, '0')}
        {THIN_SPACE}h
      </td>
    </tr>
  );
}
