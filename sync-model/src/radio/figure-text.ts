/** U+2009, between groups of three digits and before a unit; it is narrower than a word space. */
export const THIN_SPACE = '\u2009';
/** U+2212, as wide as a digit, unlike the hyphen. */
export const MINUS = '\u2212';

/** "−85 dBm": at most `decimals` decimals, no trailing zeros, never "−0". */
export function figureText(value: number, decimals: number, unit?: string): string {
  const digits = Math.abs(value)
    .toFixed(decimals)
    .replace(/(\.\d*?)0+$/, '$1')
    .replace(/\.$/, '');
  const sign = value < 0 && digits !== '0' ? MINUS : '';
  return unit === undefined ? sign + digits : `${sign}${digits}${THIN_SPACE}${unit}`;
}
