const FIELD = [...'ABCDEFGHIJKLMNOPQR'];
const DIGITS = [...'0123456789'];
const SUBSQUARE = [...'abcdefghijklmnopqrstuvwx'];
export const LOCATOR_LENGTH_MAX = 8;

/** The signs that may follow the text of a Maidenhead locator: A–R, then digits, then a–x, then digits; none at the end. */
export function locatorSigns(text: string): readonly string[] {
  const alphabets = [FIELD, DIGITS, SUBSQUARE, DIGITS];
  return text.length >= LOCATOR_LENGTH_MAX ? [] : alphabets[text.length >> 1]!;
}

/** What remains of freely typed text when each sign that cannot stand in its place is left out, in the usual spelling. */
export function typedLocator(raw: string): string {
  let text = '';
  for (const sign of raw) {
    const allowed = locatorSigns(text);
    const found = allowed.find((one) => one.toLowerCase() === sign.toLowerCase());
    if (found !== undefined) text += found;
  }
  return text;
}
