import type { CorrectedFrequency } from '@harkmoor/sync-model/evidence/corrected-frequency';
import type { CorrectedTime } from '@harkmoor/sync-model/evidence/corrected-time';
import { isSilenced, onAirState } from '@harkmoor/sync-model/evidence/schedule';
import { LEFT_OUT_WORDS, type Classification } from '@harkmoor/sync-model/evidence/tries';
import type { Reception } from '@harkmoor/sync-model/records/reception';
import type { MeterScale } from '@harkmoor/sync-model/records/receiver';
import type { Target } from '@harkmoor/sync-model/records/target';
import { figureText, isoDate, shortDate, utcDate, utcHourMinute, withUnit } from '../../../platform/utc-text';

/** On what the corrected time rests. */
export function timeBasisWords({ basis, offsetMs }: CorrectedTime): string {
  const by =
    offsetMs === 0
      ? 'nothing to correct'
      : `${lengthWords(offsetMs)} ${offsetMs < 0 ? 'taken off' : 'added'}`;
  if (basis === 'between') return `Between a clock check before and one after: ${by}.`;
  if (basis === 'nearest') return `By the nearest clock check within 12 h: ${by}.`;
  return 'The clock was not checked within 12 h: the device’s time as it is.';
}

/** "40 ms", "0.3 s", "3 min 12 s", "2.5 h". */
function lengthWords(offsetMs: number): string {
  const lengthMs = Math.abs(offsetMs);
  if (lengthMs < 100) return withUnit(lengthMs, 'ms');
  const wholeS = Math.round(lengthMs / 1000);
  if (wholeS < 60) return withUnit(lengthMs / 1000, 's', 1);
  if (wholeS < 7200) return `${withUnit(Math.floor(wholeS / 60), 'min')} ${withUnit(wholeS % 60, 's')}`;
  return withUnit(wholeS / 3600, 'h', 1);
}

/** On what the corrected frequency rests. */
export function frequencyBasisWords({ basis, errorPpm, checkedAt }: CorrectedFrequency): string {
  if (basis === 'unchecked' || checkedAt === null)
    return 'The receiver’s dial was not checked: as it was read.';
  return `By the dial check of ${utcDate(checkedAt)}: the dial reads ${figureText(Math.abs(errorPpm), 1)}\u202fppm ${errorPpm < 0 ? 'low' : 'high'}.`;
}

/** On what a level in dBm rests. */
export function levelBasisWords(scale: MeterScale | null): string {
  if (!scale || scale.kind === 'none') return 'The receiver has no meter, so there is no level.';
  const taken = 'attenuation added back, preamplifier taken off';
  if (scale.kind === 'dbm') return `The meter shows dBm; ${taken}.`;
  const how = scale.calibrated ? 'a calibrated meter' : 'a meter that was not calibrated';
  return `By the receiver’s scale, S9 at ${withUnit(scale.s9Dbm, 'dBm')} and ${withUnit(scale.dbPerS, 'dB')} an S-unit, ${how}; ${taken}.`;
}

/** Whether the target should have been on the air at that time. */
export function scheduleWords(target: Pick<Target, 'schedule' | 'silences'>, atMs: number): string {
  if (isSilenced(target, atMs)) return 'Off the air then: an organizer has set a silence.';
  if (target.schedule === 'always') return 'On the air at all hours by its schedule.';
  const state = onAirState(target, atMs);
  if (state.kind === 'on') {
    return state.until === null
      ? 'On the air by its schedule.'
      : `On the air until ${when(state.until, atMs)} UTC by its schedule.`;
  }
  return state.from === null
    ? 'Off the air by its schedule.'
    : `Off the air until ${when(state.from, atMs)} UTC by its schedule.`;
}

function when(thenMs: number, atMs: number): string {
  return isoDate(thenMs) === isoDate(atMs)
    ? utcHourMinute(thenMs)
    : `${shortDate(thenMs)}, ${utcHourMinute(thenMs)}`;
}

/** Whether it counts as evidence, and why not where it does not. */
export function evidenceWords({ counts, reason }: Classification): string {
  if (counts === 'try' && reason === null) {
    return 'A try: the first one of its UTC hour counts in heard rates; its scores and levels count too.';
  }
  if (counts === 'try') return `A try. ${LEFT_OUT_WORDS[reason!]}`;
  return counts === 'scores-only' ? LEFT_OUT_WORDS[reason] : `Counts in nothing. ${LEFT_OUT_WORDS[reason]}`;
}

export const NIL_REASON_WORDS: Readonly<Record<NonNullable<Reception['nilReason']>, string>> = {
  nothing: 'Nothing on the frequency',
  covered: 'Covered by another station',
  noise: 'Too much noise here',
  fault: 'Receiver or antenna fault',
};

export const BASIS_WORDS: Readonly<Record<Reception['basis'], string>> = {
  round: 'In a round of the target list',
  planned: 'Chosen before listening',
  chance: 'Met by chance',
  swap: 'In a swap test',
  import: 'Imported',
};

export const IDENTITY_WORDS: Readonly<Record<Reception['identity'], string>> = {
  sure: 'Surely identified',
  tentative: 'Tentative',
  unknown: 'Not identified',
};
