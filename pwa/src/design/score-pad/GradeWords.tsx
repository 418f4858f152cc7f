import {
  SINPO_LETTERS,
  SINPO_MEANINGS,
  SINPO_NAMES,
  sinpoHint,
  type SinpoLetter,
} from '@harkmoor/sync-model/radio/signal/sinpo';
import type { Figures } from './ScorePad';

type GradeWordsProps = {
  readonly figures: Figures;
  /** The column touched last. */
  readonly touched: SinpoLetter | null;
  readonly hasOutlines: boolean;
};

/** The touched grade in words and what comes next; where O stands too high for the rest, a question instead. */
export function GradeWords({ figures, touched, hasOutlines }: GradeWordsProps) {
  const grade = touched ? figures[touched] : undefined;
  const hint = hintOf(figures);
  return (
    <p className="hm-pad-say" role="status">
      {touched && grade !== undefined ? (
        <>
          <b>
            {touched.toUpperCase()} {grade}
          </b>{' '}
          {SINPO_MEANINGS[touched][grade]}. {hint ?? nextWords(figures)}
        </>
      ) : Object.keys(figures).length > 0 ? (
        (hint ?? nextWords(figures))
      ) : hasOutlines ? (
        'The scores of the entry before are outlines. Only what you touch counts.'
      ) : (
        'Five is best in every column. Save whenever you like.'
      )}
    </p>
  );
}

function nextWords(figures: Figures): string {
  const open = SINPO_LETTERS.find((letter) => figures[letter] === undefined);
  if (open === undefined) return 'All five are given.';
  return open === 'o' ? 'Now the overall score.' : `Now ${SINPO_NAMES[open]}.`;
}

function hintOf(figures: Figures): string | null {
  const grade = (letter: SinpoLetter) => figures[letter] ?? 'X';
  return sinpoHint({ s: grade('s'), i: grade('i'), n: grade('n'), p: grade('p'), o: grade('o') });
}
