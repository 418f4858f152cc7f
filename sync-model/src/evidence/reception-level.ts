import { levelDbm } from '../radio/signal/meter.js';
import type { MeterScale } from '../records/receiver.js';
import type { Setup } from '../records/setup.js';
import type { ReceptionFields } from './evidence-input.js';

/**
 * The level at the antenna's end of the setup, dBm: the meter by its receiver's scale, with attenuation added
 * back and the preamplifier taken off, so that a switch of the attenuator does not look like a change of the
 * signal. Null where no meter was read, the receiver has none, or the reading was only carried over from the
 * entry before.
 */
export function receptionLevelDbm(
  fields: Pick<ReceptionFields, 'meter' | 'carried' | 'tuning' | 'attenuationDb'>,
  setup: Pick<Setup, 'attenuationDb' | 'preampDb'>,
  scale: MeterScale,
): number | null {
  if (fields.meter === null || fields.carried?.includes('meter')) return null;
  const atInputDbm = levelDbm(fields.meter, scale, fields.tuning.dialHz);
  if (atInputDbm === null) return null;
  return atInputDbm + (fields.attenuationDb ?? setup.attenuationDb) - setup.preampDb;
}

/** The overall figure of SINPO as it was judged for this reception; null where X, not given or only carried over. */
export function receptionScore({
  sinpo,
  carried,
}: Pick<ReceptionFields, 'sinpo' | 'carried'>): 1 | 2 | 3 | 4 | 5 | null {
  if (sinpo === null || sinpo.o === 'X' || carried?.includes('sinpo')) return null;
  return sinpo.o;
}
