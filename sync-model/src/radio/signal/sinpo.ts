import type { Sinpo } from '../../records/reception.js';

export const SINPO_LETTERS = ['s', 'i', 'n', 'p', 'o'] as const;
export type SinpoLetter = (typeof SINPO_LETTERS)[number];
/** 5 is best in every column, also for interference, noise and propagation; X means not judged. */
export type SinpoGrade = Sinpo['s'];

export const SINPO_NAMES: Record<SinpoLetter, string> = {
  s: 'strength',
  i: 'interference',
  n: 'noise',
  p: 'propagation',
  o: 'overall',
};

/**
 * What each grade means. The judging words (excellent, slight, severe …) are those of the table in
 * Rec. ITU-R SM.1135, read in a secondary source; the nouns are added so that a grade reads alone.
 */
export const SINPO_MEANINGS: Record<SinpoLetter, Record<SinpoGrade, string>> = {
  s: {
    5: 'excellent strength',
    4: 'good strength',
    3: 'fair strength',
    2: 'poor strength',
    1: 'barely audible',
    X: 'not judged',
  },
  i: {
    5: 'no interference',
    4: 'slight interference',
    3: 'moderate interference',
    2: 'severe interference',
    1: 'extreme interference',
    X: 'not judged',
  },
  n: {
    5: 'no noise',
    4: 'slight noise',
    3: 'moderate noise',
    2: 'severe noise',
    1: 'extreme noise',
    X: 'not judged',
  },
  p: {
    5: 'no fading or echo',
    4: 'slight fading or echo',
    3: 'moderate fading or echo',
    2: 'severe fading or echo',
    1: 'extreme fading or echo',
    X: 'not judged',
  },
  o: {
    5: 'excellent overall',
    4: 'good overall',
    3: 'fair overall',
    2: 'poor overall',
    1: 'unusable',
    X: 'not judged',
  },
};

/** The five figures in their fixed order, "4433X". */
export function formatSinpo(sinpo: Sinpo): string {
  return SINPO_LETTERS.map((letter) => String(sinpo[letter])).join('');
}

/**
 * Reads "45433", "34X32" or "SINPO 25432" in either case. Anything else is undefined, the eight figures
 * of a SINPFEMO report too: a reception has no place for three of them, and dropping them would be silent.
 */
export function parseSinpo(text: string): Sinpo | undefined {
  const figures = /^(?:SINPO\s*)?([1-5X]{5})$/.exec(text.trim().toUpperCase())?.[1];
  if (figures === undefined) return undefined;
  const [s, i, n, p, o] = [...figures].map(gradeOf);
  if (!s || !i || !n || !p || !o) throw new Error(`Five figures expected in ${figures}.`);
  return { s, i, n, p, o };
}

function gradeOf(figure: string): SinpoGrade {
  return figure === 'X' ? 'X' : (Number(figure) as Exclude<SinpoGrade, 'X'>);
}

/**
 * A sentence where the overall score stands above what the other figures allow, else null. Only a hint:
 * the Recommendation gives no formula for O, so a score is never refused for it. Figures not judged count
 * for nothing. Practice: O is not above S, nor two above the worst of the four.
 */
export function sinpoHint(sinpo: Sinpo): string | null {
  const { o, s } = sinpo;
  if (o === 'X') return null;
  if (s !== 'X' && o > s) return `Overall ${o} stands above strength ${s}. Is that what you heard?`;
  const worst = worstOfFour(sinpo);
  if (worst && o > worst.grade + 1) {
    return `Overall ${o} stands well above ${SINPO_NAMES[worst.letter]} ${worst.grade}. Is that what you heard?`;
  }
  return null;
}

function worstOfFour(sinpo: Sinpo): { letter: SinpoLetter; grade: number } | undefined {
  let worst: { letter: SinpoLetter; grade: number } | undefined;
  for (const letter of SINPO_LETTERS) {
    const grade = sinpo[letter];
    if (letter === 'o' || grade === 'X') continue;
    if (!worst || grade < worst.grade) worst = { letter, grade };
  }
  return worst;
}
