import { isLeftOut } from '@harkmoor/sync-model/merge/history-value';
import { frequencyText } from '@harkmoor/sync-model/radio/bands/frequency-text';
import { formatMeter } from '@harkmoor/sync-model/radio/signal/meter';
import { formatRst } from '@harkmoor/sync-model/radio/signal/rst';
import { formatSinpo } from '@harkmoor/sync-model/radio/signal/sinpo';
import type { Reception } from '@harkmoor/sync-model/records/reception';
import { figureText, utcDate, utcTime, withUnit } from '../../../platform/utc-text';
import type { NamesOfIds } from '../data/held-reception';
import { BASIS_WORDS, IDENTITY_WORDS, NIL_REASON_WORDS } from './reading-words';

const FIELD_WORDS: Readonly<Record<keyof Reception, string>> = {
  deleted: 'Bin',
  importId: 'Import',
  outingId: 'Outing',
  siteId: 'Site',
  setupId: 'Setup',
  targetId: 'Target',
  targetHz: 'Target’s frequency',
  eventId: 'Event',
  swap: 'Swap test',
  roundNo: 'Round',
  outcome: 'Outcome',
  basis: 'How it was met',
  identity: 'Identity',
  nilReason: 'Reason of the nil',
  deviceAt: 'Time',
  durationS: 'Listened',
  tuning: 'Dial',
  bandwidthHz: 'Bandwidth',
  attenuationDb: 'Attenuation',
  sinpo: 'SINPO',
  rst: 'RST',
  meter: 'Meter',
  noiseMeter: 'Noise beside it',
  carried: 'Taken over, not touched',
  programme: 'Programme details',
  remarks: 'Remarks',
  stationName: 'Station',
  heardBy: 'Heard by',
};

const OUTCOME_WORDS: Readonly<Record<Reception['outcome'], string>> = {
  heard: 'Heard',
  nil: 'Nil',
  skipped: 'Skipped',
};

type Known = {
  readonly [F in keyof Reception]?: (value: NonNullable<Reception[F]>, names: NamesOfIds) => string;
};

const VALUE_WORDS: Known = {
  deleted: (value) => (value ? 'in the bin' : 'in the log'),
  siteId: (id, names) => names('site', id) ?? 'a site not on this device',
  setupId: (id, names) => names('setup', id) ?? 'a setup not on this device',
  targetId: (id, names) => names('target', id) ?? 'a target not on this device',
  outingId: () => 'another outing',
  targetHz: frequencyText,
  outcome: (value) => OUTCOME_WORDS[value],
  basis: (value) => BASIS_WORDS[value],
  identity: (value) => IDENTITY_WORDS[value],
  nilReason: (value) => NIL_REASON_WORDS[value],
  deviceAt: (atMs) => `${utcDate(atMs)}, ${utcTime(atMs)} UTC`,
  durationS: (seconds) => withUnit(seconds, 's'),
  tuning: ({ dialHz, mode }) => `${frequencyText(dialHz)} ${mode}`,
  bandwidthHz: (hz) => withUnit(hz, 'Hz'),
  attenuationDb: (db) => withUnit(db, 'dB'),
  sinpo: formatSinpo,
  rst: formatRst,
  meter: formatMeter,
  noiseMeter: formatMeter,
  carried: (fields) => fields.map((field) => FIELD_WORDS[field]).join(', '),
  programme: (details) => details.map(({ text }) => text).join(' / '),
  remarks: (text) => `“${text}”`,
  stationName: (text) => `“${text}”`,
  heardBy: (text) => `“${text}”`,
};

/** What a field is called on the screens. */
export function fieldWords(field: string): string {
  return Object.hasOwn(FIELD_WORDS, field) ? FIELD_WORDS[field as keyof Reception] : field;
}

/** A value of a field as a person reads it; never throws, whatever an older version may have left. */
export function valueWords(field: string, value: unknown, names: NamesOfIds): string {
  if (value === null || value === undefined || value === '') return 'empty';
  if (isLeftOut(value)) return `a text of ${figureText(value.leftOutBytes)} bytes, too long to be kept`;
  const words = Object.hasOwn(VALUE_WORDS, field)
    ? (VALUE_WORDS[field as keyof Reception] as (value: never, names: NamesOfIds) => unknown)
    : undefined;
  try {
    const text = words?.(value as never, names);
    return typeof text === 'string' ? text : JSON.stringify(value);
  } catch {
    return JSON.stringify(value);
  }
}
