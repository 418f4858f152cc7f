import { THIN_SPACE } from '../figure-text.js';

/** What a reception may be tuned to. */
export const FREQUENCY_MIN_HZ = 1000;
export const FREQUENCY_MAX_HZ = 3_000_000_000;
/** From here up the trade speaks of MHz. */
const SHOWN_IN_MHZ_FROM_HZ = 30_000_000;
/** A decimal below this may well have been meant in MHz. */
const MAYBE_MHZ_BELOW = 1000;

export type FrequencyRefusal = 'empty' | 'not-a-frequency' | 'finer-than-1-hz' | 'out-of-range';

/**
 * What a typed frequency means. `alternativeHz` is the reading in MHz to be offered beside it, where a
 * decimal below 1 000 was typed without a unit and MHz would be in range.
 */
export type FrequencyReading =
  | { kind: 'frequency'; frequencyHz: number; alternativeHz: number | null }
  | { kind: 'metre-band'; metres: number }
  | { kind: 'refused'; code: FrequencyRefusal; message: string; alternativeHz: number | null };

const MESSAGES: Record<FrequencyRefusal, string> = {
  empty: 'Type a frequency in kHz.',
  'not-a-frequency': 'This is not a frequency. Type kHz as a plain number, or put M for MHz after it.',
  'finer-than-1-hz': 'Frequencies are kept to 1 Hz. Leave out the digits after that.',
  'out-of-range': 'A frequency lies between 1 kHz and 3 GHz.',
};

/** Digits, one point or comma, more digits; spaces are taken out before. */
const NUMBER = /^(\d*)(?:[.,](\d*))?$/;
const ZEROS_IN_HZ = { kHz: 3, MHz: 6 } as const;
type Unit = keyof typeof ZEROS_IN_HZ;

/**
 * Reads a typed frequency. A plain number is kHz ("5000", "5000.2"); k and kHz, M and MHz are as written; a
 * lower-case m after a whole number is the metre band, never MHz. Comma and point both begin the decimals;
 * spaces between groups of digits do not matter. What cannot be meant is refused with a sentence.
 */
export function readFrequency(text: string): FrequencyReading {
  const [, figure = '', suffix = ''] = /^([^a-z]*)([a-z]*)$/i.exec(text.replace(/\s/g, '')) ?? ['', 'x'];
  if (figure === '' && suffix === '') return refused('empty');
  const parts = NUMBER.exec(figure);
  const whole = parts?.[1] ?? '';
  const decimals = parts?.[2];
  if (!parts || whole + (decimals ?? '') === '') return refused('not-a-frequency');
  if (suffix === 'm') return metreBand(whole, decimals);
  const unit = suffix === '' ? 'kHz' : unitOf(suffix);
  if (!unit) return refused('not-a-frequency');
  const maybeMhz = suffix === '' && decimals !== undefined && Number(whole) < MAYBE_MHZ_BELOW;
  const other = maybeMhz ? hertzOf(whole, decimals, 'MHz') : null;
  const alternativeHz = typeof other === 'number' ? other : null;
  const reading = hertzOf(whole, decimals ?? '', unit);
  if (typeof reading !== 'number') return refused(reading, alternativeHz);
  return { kind: 'frequency', frequencyHz: reading, alternativeHz };
}

function unitOf(suffix: string): Unit | null {
  if (suffix === 'M' || /^mhz$/i.test(suffix)) return 'MHz';
  return /^k(hz)?$/i.test(suffix) ? 'kHz' : null;
}

function metreBand(whole: string, decimals: string | undefined): FrequencyReading {
  const metres = Number(whole);
  if (decimals !== undefined || metres < 1 || metres > 9999) return refused('not-a-frequency');
  return { kind: 'metre-band', metres };
}

/** Works on the digits themselves: 5000.2 × 1 000 in binary fractions is not always whole. */
function hertzOf(whole: string, decimals: string, unit: Unit): number | FrequencyRefusal {
  const zeros = ZEROS_IN_HZ[unit];
  const significant = decimals.replace(/0+$/, '');
  if (significant.length > zeros) return 'finer-than-1-hz';
  const hertz = Number(whole + significant.padEnd(zeros, '0'));
  return hertz >= FREQUENCY_MIN_HZ && hertz <= FREQUENCY_MAX_HZ ? hertz : 'out-of-range';
}

function refused(code: FrequencyRefusal, alternativeHz: number | null = null): FrequencyReading {
  return { kind: 'refused', code, message: MESSAGES[code], alternativeHz };
}

/**
 * A frequency as figure and unit, "6 070" and "kHz", to 1 Hz, with thin spaces between groups of three digits: in
 * kHz below 30 MHz, in MHz above. `readFrequency` reads it back.
 */
export function formatFrequency(frequencyHz: number): { figure: string; unit: 'kHz' | 'MHz' } {
  const unit = frequencyHz < SHOWN_IN_MHZ_FROM_HZ ? 'kHz' : 'MHz';
  const zeros = ZEROS_IN_HZ[unit];
  const digits = String(Math.round(frequencyHz)).padStart(zeros + 1, '0');
  const whole = digits.slice(0, -zeros).replace(/\B(?=(\d{3})+$)/g, THIN_SPACE);
  const decimals = digits.slice(-zeros).replace(/0+$/, '');
  return { figure: decimals === '' ? whole : `${whole}.${decimals}`, unit };
}

/** Figure and unit in one text with a thin space between: "6 070 kHz". */
export function frequencyText(frequencyHz: number): string {
  const { figure, unit } = formatFrequency(frequencyHz);
  return `${figure}${THIN_SPACE}${unit}`;
}
