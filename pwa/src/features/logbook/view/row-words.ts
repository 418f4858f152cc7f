import type { SendState } from '@harkmoor/sync-model/device/stored-record';
import { formatFrequency } from '@harkmoor/sync-model/radio/bands/frequency-text';
import { formatRst } from '@harkmoor/sync-model/radio/signal/rst';
import { formatSinpo } from '@harkmoor/sync-model/radio/signal/sinpo';
import type { Reception } from '@harkmoor/sync-model/records/reception';
import { figureText, utcDate } from '../../../platform/utc-text';
import type { GroupHead } from '../index/log-view';
import type { OwedState } from '../index/log-row';

const NIL_SHORT: Readonly<Record<NonNullable<Reception['nilReason']>, string>> = {
  nothing: 'nothing',
  covered: 'covered',
  noise: 'noise',
  fault: 'receiver fault',
};

/** "35433", "59", "Heard", "Nil", "Nil, noise", "Skipped"; figures that were only carried over are no score. */
export function outcomeText(
  row: Pick<Reception, 'outcome' | 'nilReason' | 'sinpo' | 'rst' | 'carried'>,
): string {
  if (row.outcome === 'skipped') return 'Skipped';
  if (row.outcome === 'nil') return row.nilReason ? `Nil, ${NIL_SHORT[row.nilReason]}` : 'Nil';
  if (row.sinpo && !row.carried?.includes('sinpo')) return formatSinpo(row.sinpo);
  if (row.rst && !row.carried?.includes('rst')) return formatRst(row.rst);
  return 'Heard';
}

/** "12 Nov 2026 · Ravnklit dune"; with whose it was where it was another's. */
export function headText({ atMs, siteName, operator, hasOuting }: GroupHead): string {
  const words = [utcDate(atMs), siteName];
  if (operator !== null) words.push(operator);
  if (!hasOuting) words.push('no outing');
  return words.join(' · ');
}

/** For screen readers: "6070 kilohertz". */
export function spokenFrequency(frequencyHz: number): string {
  const { figure, unit } = formatFrequency(frequencyHz);
  return `${figure.replace(/\s/g, '')} ${unit === 'kHz' ? 'kilohertz' : 'megahertz'}`;
}

/** "1 reception", "34 of 6 012 receptions". */
export function countText(shownCount: number, ofCount: number): string {
  const noun = ofCount === 1 ? 'reception' : 'receptions';
  if (shownCount === ofCount) return `${figureText(ofCount)} ${noun}`;
  return `${figureText(shownCount)} of ${figureText(ofCount)} ${noun}`;
}

/** The state that a person is told of a row; what is on its way is known only while it runs. */
export function sendStateOfRow(owed: OwedState, isInFlight: boolean): SendState {
  if (owed === 'none') return 'sent';
  if (owed === 'refused') return 'needs-attention';
  return isInFlight ? 'sending' : 'only-here';
}
