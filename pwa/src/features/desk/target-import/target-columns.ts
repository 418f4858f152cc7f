/** What a column of an imported file can hold; `ignore` is left out. */
export const COLUMN_MEANINGS = [
  'ignore',
  'name',
  'frequency',
  'mode',
  'from',
  'to',
  'hours',
  'days',
  'latitude',
  'longitude',
  'powerKw',
  'language',
  'note',
] as const;
export type ColumnMeaning = (typeof COLUMN_MEANINGS)[number];

export const MEANING_WORDS: Record<ColumnMeaning, string> = {
  ignore: 'Left out',
  name: 'Name',
  frequency: 'Frequency, kHz (or with MHz)',
  mode: 'Mode',
  from: 'On air from, UTC',
  to: 'On air to, UTC',
  hours: 'Hours as 0400-2000, UTC',
  days: 'Days',
  latitude: 'Transmitter latitude',
  longitude: 'Transmitter longitude',
  powerKw: 'Power, kW',
  language: 'Language',
  note: 'Note',
};

const GUESSES: readonly [ColumnMeaning, RegExp][] = [
  ['frequency', /^(freq|frequency|khz|mhz|qrg|channel)/i],
  ['name', /^(name|station|target|transmission|programme|program)/i],
  ['mode', /^(mode|modulation|class)/i],
  ['hours', /^(hours|time|utc|schedule|on air)$/i],
  ['from', /^(from|start|begin|on)$/i],
  ['to', /^(to|end|stop|until|off)$/i],
  ['days', /^(days?|weekdays?)/i],
  ['latitude', /^lat/i],
  ['longitude', /^(lon|lng)/i],
  ['powerKw', /^(power|kw)/i],
  ['language', /^lang/i],
  ['note', /^(note|remark|comment|info)/i],
];

/** What the headers most likely mean; each meaning is given once, the rest is left out. */
export function guessMeanings(headers: readonly string[]): ColumnMeaning[] {
  const taken = new Set<ColumnMeaning>();
  return headers.map((header) => {
    const found = GUESSES.find(([meaning, pattern]) => !taken.has(meaning) && pattern.test(header.trim()));
    if (!found) return 'ignore';
    taken.add(found[0]);
    return found[0];
  });
}
