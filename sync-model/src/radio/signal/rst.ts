import type { Rst } from '../../records/reception.js';

export const RST_NAMES = { r: 'readability', s: 'strength', t: 'tone' } as const;
export type RstLetter = keyof typeof RST_NAMES;

/**
 * What each grade means, by letter, the first entry being grade 1. After the list of the ARRL Handbook of
 * 1992, as quoted by a club; wordings of the tone differ a little between lists.
 */
const MEANINGS: Record<RstLetter, readonly string[]> = {
  r: [
    'unreadable',
    'barely readable, odd words',
    'readable with considerable difficulty',
    'readable with practically no difficulty',
    'perfectly readable',
  ],
  s: [
    'faint, barely perceptible',
    'very weak',
    'weak',
    'fair',
    'fairly good',
    'good',
    'moderately strong',
    'strong',
    'extremely strong',
  ],
  t: [
    'rough, mains-like note',
    'very rough note',
    'rough note, rectified only',
    'rough note, some filtering',
    'filtered note, strong ripple',
    'filtered note, clear ripple',
    'nearly pure note, trace of ripple',
    'nearly perfect note',
    'perfect note',
  ],
};

/** The grade in words; null where the letter has no such grade. */
export function rstMeaning(letter: RstLetter, grade: number): string | null {
  return MEANINGS[letter][grade - 1] ?? null;
}

/** "59" for voice, "599" for telegraphy. */
export function formatRst({ r, s, t }: Rst): string {
  return `${r}${s}${t ?? ''}`;
}

/**
 * Reads "59", "599" or "RST 599": readability 1–5, strength 1–9 and, for telegraphy, tone 1–9. Anything else
 * is undefined, the suffixes X, C, K and A of the trade too: a reception has no place for them.
 */
export function parseRst(text: string): Rst | undefined {
  const match = /^(?:RST?\s*)?([1-5])([1-9])([1-9])?$/i.exec(text.trim());
  if (!match) return undefined;
  const rst = { r: Number(match[1]), s: Number(match[2]) };
  return match[3] === undefined ? rst : { ...rst, t: Number(match[3]) };
}
