import { frequencyText } from '@harkmoor/sync-model/radio/bands/frequency-text';
import { utcDate, utcTime } from '../../../platform/utc-text';
import type { HeldReception } from '../data/held-reception';

/** The frequency, and under it what it was, and when. */
export function receptionTitle({ record, target }: Pick<HeldReception, 'record' | 'target'>): {
  title: string;
  subtitle: string;
} {
  const { tuning, deviceAt, stationName } = record.fields;
  const when = `${utcDate(deviceAt)}, ${utcTime(deviceAt)} UTC`;
  const name = stationName || target?.name;
  return { title: frequencyText(tuning.dialHz), subtitle: name ? `${name} · ${when}` : when };
}
