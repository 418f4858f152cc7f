import type { SquareFigures } from '../answers/questions';
import { distributionWords, rateSentence, scoreFigure } from '../view/figure-words';

/** "JO46ac: 83 % heard, 95 % 72–90, 58 of 70 on 31 dates; O 3 (4 in 22 · 3 in 29)": a square in one line. */
export function squareLine({ locator, coarseOnly, rate, score }: SquareFigures): string {
  const shared = coarseOnly ? ', shared only so finely' : '';
  const scored = score.median === null ? '' : `; ${scoreFigure(score)} (${distributionWords(score)})`;
  return `${locator}${shared}: ${rateSentence(rate)}${scored}`;
}
