import { NO_RATE_WORDS, type HeardRate } from '@harkmoor/sync-model/evidence/heard-rate';
import type { TypicalScore } from '@harkmoor/sync-model/evidence/typical-score';
import { counted, percentWords } from './scope-words';
import { figureText } from '../../../platform/utc-text';

/** "95 % 72–90", in per cent; nothing where there is no rate. */
export function intervalWords({ interval }: HeardRate): string | undefined {
  return interval ? `95 % ${Math.round(interval.low * 100)}–${Math.round(interval.high * 100)}` : undefined;
}

/** "58 of 70 · 31 dates". */
export function sampleWords({ heard, n, dates }: HeardRate): string {
  return `${figureText(heard)} of ${figureText(n)} · ${counted(dates, 'date')}`;
}

/** "83 % heard (mean of 3 hours), 95 % 72–90, 58 of 70 on 31 dates, thin": a rate with all that belongs to it, in one line. */
export function rateSentence(rate: HeardRate): string {
  if (rate.rate === null) {
    return rate.n === 0 ? NO_RATE_WORDS[rate.reason] : `no rate, ${sampleSentence(rate)}`;
  }
  const thin = rate.isThin ? ', thin' : '';
  const mean = rate.hours > 1 ? ` (mean of ${rate.hours} hours)` : '';
  return `${percentWords(rate.rate)} heard${mean}, ${intervalWords(rate)}, ${sampleSentence(rate)}${thin}`;
}

/** "4 in 22 · 3 in 29 · 2 in 7": how many got which score, the best first. */
export function distributionWords({ distribution }: TypicalScore): string {
  return distribution
    .map((n, index) => ({ score: index + 1, n }))
    .filter(({ n }) => n > 0)
    .reverse()
    .map(({ score, n }) => `${score}\u00a0in\u00a0${figureText(n)}`)
    .join(' · ');
}

/** "O 3", "O 3.5", or a dash where nothing was scored. */
export function scoreFigure({ median }: TypicalScore): string {
  return median === null ? '–' : `O ${median}`;
}

function sampleSentence({ heard, n, dates }: HeardRate): string {
  return `${figureText(heard)} of ${figureText(n)} on ${counted(dates, 'date')}`;
}
