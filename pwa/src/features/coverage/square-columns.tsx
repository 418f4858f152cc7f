import type { Column } from '../../design/table/DataTable';
import { figureText } from '../../platform/utc-text';
import type { SquareFigures } from './answers/questions';
import { percentWords } from './view/scope-words';

/** All figures of a square, each with its sample beside it. */
export function squareColumns(): Column<SquareFigures>[] {
  return [
    { key: 'square', header: 'Square', cell: ({ locator }) => locator, sortBy: ({ locator }) => locator },
    figure('heard', 'Heard', ({ rate }) => rate.rate, percentWords),
    figure('low', '95 % from', ({ rate }) => rate.interval?.low ?? null, percentWords),
    figure('high', '95 % to', ({ rate }) => rate.interval?.high ?? null, percentWords),
    figure('heardN', 'Heard, n', ({ rate }) => rate.heard, figureText),
    figure('n', 'Observations', ({ rate }) => rate.n, figureText),
    figure('dates', 'Dates', ({ rate }) => rate.dates, figureText),
    figure('hours', 'Hours', ({ rate }) => rate.hours, figureText),
    figure('score', 'Typical O', ({ score }) => score.median, String),
    figure('scored', 'Scored', ({ score }) => score.n, figureText),
    {
      key: 'note',
      header: 'Note',
      cell: (square) => <span className="cov-note">{noteOf(square)}</span>,
      sortBy: noteOf,
    },
  ];
}

function figure(
  key: string,
  header: string,
  valueOf: (square: SquareFigures) => number | null,
  words: (value: number) => string,
): Column<SquareFigures> {
  return {
    key,
    header,
    figures: true,
    sortBy: valueOf,
    cell: (square) => {
      const value = valueOf(square);
      return value === null ? '–' : words(value);
    },
  };
}

function noteOf({ rate, coarseOnly }: SquareFigures): string {
  const notes = [
    rate.rate === null ? 'no rate: too few channels' : null,
    rate.isThin ? 'thin' : null,
    coarseOnly ? 'shared only so finely' : null,
  ];
  return notes.filter((note) => note !== null).join(', ');
}
