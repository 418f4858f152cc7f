import { THIN_SPACE, figureText } from '../../../platform/utc-text';
import type { Overview } from '../answers/questions';
import { ANTENNA_KIND_WORDS } from './antenna-kinds';
import { channelWords } from './channel-words';
import type { CoverageView, Measure, Subject } from './coverage-view';
import { shownSubject } from './evidence-filters';
import { shortRangeWords } from './hour-range';
import { monthsWords } from './months';

export const MEASURE_WORDS: Readonly<Record<Measure, string>> = {
  rate: 'Heard rate',
  score: 'Typical score',
  count: 'Observations',
};

/** "5 000 kHz", "49 m broadcast" or "Any frequency". */
export function subjectWords(subject: Exclude<Subject, { kind: 'most-tried' }>): string {
  if (subject.kind === 'any') return 'Any frequency';
  return subject.kind === 'channel' ? channelWords(subject.key) : subject.key;
}

/** "Any antenna", "Any wire" or a name. */
export function antennaWords({ antenna }: CoverageView, overview: Overview): string {
  if (antenna.kind === 'any') return 'Any antenna';
  if (antenna.kind === 'kind') return ANTENNA_KIND_WORDS[antenna.antennaKind];
  return overview.antennas.find(({ key }) => key === antenna.antennaId)?.label ?? 'unknown antenna';
}

export function setupWords({ setupId }: CoverageView, overview: Overview): string {
  if (setupId === null) return 'Any setup';
  return overview.setups.find(({ key }) => key === setupId)?.label ?? 'unknown setup';
}

export function operatorWords({ operatorId }: CoverageView, overview: Overview): string {
  if (operatorId === null) return 'Everyone';
  return overview.operators.find(({ key }) => key === operatorId)?.label ?? 'unknown operator';
}

/** The months that are shown: the chosen ones, else all with an observation. */
export function shownMonths(view: CoverageView, overview: Overview): readonly string[] {
  return view.monthKeys.length > 0 ? view.monthKeys : overview.monthKeys;
}

/** "Nov–Feb", or "No dates" where there is no observation. */
export function datesWords(view: CoverageView, overview: Overview): string {
  return monthsWords(shownMonths(view, overview)) || 'No dates';
}

/** All that narrows the figures, in words: "5 000 kHz · 15–16 UTC · Nov–Feb · Any wire". */
export function scopeWords(view: CoverageView, overview: Overview): string {
  return [
    subjectWords(shownSubject(view, overview)),
    shortRangeWords(view.hours),
    datesWords(view, overview),
    view.antenna.kind === 'any' ? null : antennaWords(view, overview),
    view.setupId === null ? null : setupWords(view, overview),
    view.operatorId === null ? null : operatorWords(view, overview),
  ]
    .filter((part) => part !== null)
    .join(' · ');
}

/** "2 311 observations in 38 squares". */
export function amountWords(observations: number, squares: number): string {
  return `${counted(observations, 'observation')} in ${counted(squares, 'square')}`;
}

/** "1 observation", "2 311 observations". */
export function counted(n: number, noun: string): string {
  return `${figureText(n)} ${noun}${n === 1 ? '' : 's'}`;
}

/** "83 %". */
export function percentWords(share: number): string {
  return `${Math.round(share * 100)}${THIN_SPACE}%`;
}
