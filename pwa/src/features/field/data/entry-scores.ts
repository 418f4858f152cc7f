import type { Reception } from '@harkmoor/sync-model/records/reception';
import type { OutlinedScores, TouchedScores } from '@harkmoor/sync-model/records/score-draft';
import { SINPO_LETTERS } from '@harkmoor/sync-model/radio/signal/sinpo';

/** The figures of an entry as outlines of the next one. */
export function outlinesOf({ sinpo, rst, meter, noiseMeter }: Reception): OutlinedScores {
  return { sinpo, rst, meter, noiseMeter };
}

/** The figures of a saved entry that count: all that were not merely carried over. */
export function touchedOf(fields: Reception): TouchedScores {
  const counts = (name: 'sinpo' | 'rst' | 'meter' | 'noiseMeter') => !fields.carried?.includes(name);
  const { sinpo, rst, meter, noiseMeter } = fields;
  return {
    sinpo: sinpo && counts('sinpo') ? Object.fromEntries(SINPO_LETTERS.map((one) => [one, sinpo[one]])) : {},
    ...(rst && counts('rst') ? { rst } : {}),
    ...(meter && counts('meter') ? { meter } : {}),
    ...(noiseMeter && counts('noiseMeter') ? { noiseMeter } : {}),
  };
}

/** The figures of a saved entry that were carried over and still count nowhere. */
export function carriedOf(fields: Reception): OutlinedScores {
  const only = <T>(name: 'sinpo' | 'rst' | 'meter' | 'noiseMeter', value: T): T | null =>
    fields.carried?.includes(name) ? value : null;
  return {
    sinpo: only('sinpo', fields.sinpo),
    rst: only('rst', fields.rst),
    meter: only('meter', fields.meter),
    noiseMeter: only('noiseMeter', fields.noiseMeter),
  };
}
