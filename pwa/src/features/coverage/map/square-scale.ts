import type { SquareCharacters } from '@harkmoor/sync-model/evidence/squares';
import type { SquareFigures } from '../answers/questions';
import type { Measure } from '../view/coverage-view';

/** How fine the squares are at a zoom: fields to 5, four characters to 8, six from 9. */
export function charactersAtZoom(zoom: number): SquareCharacters {
  return zoom < 6 ? 2 : zoom < 9 ? 4 : 6;
}

/** What a square is filled with: its place on the ramp, and the figure for cells that print it. */
export type Fill = {
  /** 0–1; null where there is no figure: tried, but not enough for one. */
  readonly share: number | null;
  /** In red night: the rate in tens of per cent, the score, or the count. */
  readonly print: string;
  readonly isThin: boolean;
};

/** The fill of a square; counts stand on a logarithmic ramp up to the largest of the map. */
export function fillOf({ rate, score }: SquareFigures, measure: Measure, largestN: number): Fill {
  const { isThin, n } = rate;
  if (measure === 'count') {
    const share = largestN <= 1 ? 1 : Math.log(Math.max(1, n)) / Math.log(largestN);
    return { share, print: shortCount(n), isThin };
  }
  if (measure === 'score') {
    const { median } = score;
    return median === null
      ? { share: null, print: '', isThin: true }
      : { share: (median - 1) / 4, print: String(median), isThin: isThin || score.n < 5 };
  }
  if (rate.rate === null) return { share: null, print: '', isThin };
  return { share: rate.rate, print: String(Math.round(rate.rate * 10)), isThin };
}

export function largestCount(squares: readonly SquareFigures[]): number {
  return squares.reduce((most, { rate }) => Math.max(most, rate.n), 0);
}

function shortCount(n: number): string {
  return n < 1000 ? String(n) : `${Math.round(n / 1000)}k`;
}
