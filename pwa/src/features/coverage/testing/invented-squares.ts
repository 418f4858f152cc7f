import { heardRate } from '@harkmoor/sync-model/evidence/heard-rate';
import { typicalScore } from '@harkmoor/sync-model/evidence/typical-score';
import type { SquareFigures } from '../answers/questions';

type Invented = {
  readonly locator?: string;
  readonly coarseOnly?: boolean;
  readonly heard?: number;
  readonly n?: number;
  readonly dates?: number;
};

/** A square of which so many of `n` tries at 19 UTC were heard with O 4, spread over `dates` dates. */
export function aSquare({
  locator = 'JO46ac',
  coarseOnly = false,
  heard = 7,
  n = 10,
  dates = 5,
}: Invented): SquareFigures {
  const tries = Array.from({ length: n }, (_, index) => ({
    heard: index < heard,
    hourUtc: 19,
    dayNumber: 20_000 + (index % dates),
    o: 4,
  }));
  return { locator, coarseOnly, rate: heardRate(tries), score: typicalScore(tries) };
}
