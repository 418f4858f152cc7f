/**
 * Reads a number as people write it: thin or plain spaces between thousands, a comma or a point before decimals, a
 * true minus sign. Null for an empty text, NaN for what is no number, so that a schema refuses it.
 */
export function readNumber(text: string): number | null {
  const plain = text.replace(/[\s\u2009\u202f\u00a0]/g, '').replace('\u2212', '-');
  if (plain === '') return null;
  const withPoint = plain.replace(',', '.');
  return /^[+-]?(\d+\.?\d*|\.\d+)$/.test(withPoint) ? Number(withPoint) : Number.NaN;
}

/** The text that `readNumber` reads back as the same number; empty for null. */
export function numberText(value: number | null): string {
  if (value === null || Number.isNaN(value)) return '';
  return value
    .toLocaleString('en-GB', { useGrouping: false, maximumFractionDigits: 10 })
    .replace('-', '\u2212');
}
