import type { Overview } from '../answers/questions';
import { narrowingCount, type CoverageView } from '../view/coverage-view';
import { shownSubject } from '../view/evidence-filters';
import { isAllHours, shortRangeWords } from '../view/hour-range';
import {
  antennaWords,
  datesWords,
  MEASURE_WORDS,
  operatorWords,
  setupWords,
  subjectWords,
} from '../view/scope-words';

/** The sheets in which something is chosen. */
export type FilterSheet =
  'subject' | 'measure' | 'antenna' | 'hours' | 'more' | 'months' | 'operator' | 'setup';

export type FilterCell = { readonly sheet: FilterSheet; readonly name: string; readonly value: string };

/** The cells of the bar on a phone: what is asked for most, and a last one for the rest. */
export function phoneCells(view: CoverageView, overview: Overview): FilterCell[] {
  const more = narrowingCount(view);
  return [
    { sheet: 'subject', name: 'frequency', value: subjectWords(shownSubject(view, overview)) },
    { sheet: 'measure', name: 'shows', value: MEASURE_WORDS[view.measure] },
    { sheet: 'antenna', name: 'antenna', value: antennaCellWords(view, overview) },
    { sheet: 'more', name: 'more', value: more === 0 ? 'All' : `${more} set` },
  ];
}

/** The cells over one square's evidence, where the hours are chosen in a sheet. */
export function squareCells(view: CoverageView, overview: Overview): FilterCell[] {
  const hours = { sheet: 'hours', name: 'hours, UTC', value: hourCellWords(view) } as const;
  return phoneCells(view, overview).map((cell) => (cell.sheet === 'measure' ? hours : cell));
}

/** All cells, for the width of a laptop. */
export function laptopCells(view: CoverageView, overview: Overview): FilterCell[] {
  return [
    { sheet: 'subject', name: 'frequency', value: subjectWords(shownSubject(view, overview)) },
    { sheet: 'hours', name: 'hours, UTC', value: hourCellWords(view) },
    { sheet: 'months', name: 'dates', value: datesWords(view, overview) },
    { sheet: 'antenna', name: 'antenna', value: antennaCellWords(view, overview) },
    {
      sheet: 'setup',
      name: 'setup',
      value: view.setupId === null ? 'Any' : setupWords(view, overview),
    },
    { sheet: 'operator', name: 'operator', value: operatorWords(view, overview) },
    { sheet: 'measure', name: 'shows', value: MEASURE_WORDS[view.measure] },
  ];
}

function hourCellWords({ hours }: CoverageView): string {
  return isAllHours(hours) ? 'All hours' : shortRangeWords(hours).replace(' UTC', '');
}

/** The cell's name says what *Any* is of. */
function antennaCellWords(view: CoverageView, overview: Overview): string {
  return view.antenna.kind === 'any' ? 'Any' : antennaWords(view, overview);
}
