import { SINPO_LETTERS, type SinpoGrade, type SinpoLetter } from '../radio/signal/sinpo.js';
import type { MeterReading } from './common-fields.js';
import type { Reception, Rst, Sinpo } from './reception.js';

type CarriedField = NonNullable<Reception['carried']>[number];

/** The figures of a pad that was not saved yet. Absent: not touched; X: touched and taken back. */
export type TouchedScores = {
  sinpo: Partial<Record<SinpoLetter, SinpoGrade>>;
  rst?: Rst | null;
  meter?: MeterReading | null;
  noiseMeter?: MeterReading | null;
};

/** What *Same again* shows as outlines: the figures of the entry before. */
export type OutlinedScores = Pick<Reception, 'sinpo' | 'rst' | 'meter' | 'noiseMeter'>;

export const NO_OUTLINES: OutlinedScores = { sinpo: null, rst: null, meter: null, noiseMeter: null };

type ScoreFields = Pick<Reception, 'sinpo' | 'rst' | 'meter' | 'noiseMeter' | 'carried'>;

/**
 * The score fields that saving stores. A touched figure counts; where one figure of a SINPO was touched, the
 * untouched ones are X, never the old ones. A field of which nothing was touched keeps the outlined value and
 * is named in `carried`, which counts nowhere.
 */
export function scoresToSave(touched: TouchedScores, outlined: OutlinedScores): ScoreFields {
  const carried: CarriedField[] = [];
  const takeOver = <T>(field: CarriedField, value: T | undefined, old: T | null): T | null => {
    if (value !== undefined) return value;
    if (old !== null) carried.push(field);
    return old;
  };
  const fields = {
    sinpo: takeOver('sinpo', touchedSinpo(touched.sinpo), outlined.sinpo),
    rst: takeOver('rst', touched.rst, outlined.rst),
    meter: takeOver('meter', touched.meter, outlined.meter),
    noiseMeter: takeOver('noiseMeter', touched.noiseMeter, outlined.noiseMeter),
  };
  return { ...fields, carried: carried.length > 0 ? carried : null };
}

/** The SINPO that the touched figures make: undefined where none was touched, null where all were taken back. */
export function touchedSinpo(figures: TouchedScores['sinpo']): Sinpo | null | undefined {
  const letters = SINPO_LETTERS.filter((letter) => figures[letter] !== undefined);
  if (letters.length === 0) return undefined;
  if (letters.every((letter) => figures[letter] === 'X')) return null;
  const grade = (letter: SinpoLetter): SinpoGrade => figures[letter] ?? 'X';
  return { s: grade('s'), i: grade('i'), n: grade('n'), p: grade('p'), o: grade('o') };
}
