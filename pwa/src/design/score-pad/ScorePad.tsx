import { useRef, type KeyboardEvent } from 'react';
import {
  SINPO_LETTERS,
  SINPO_MEANINGS,
  SINPO_NAMES,
  type SinpoGrade,
  type SinpoLetter,
} from '@harkmoor/sync-model/radio/signal/sinpo';
import './score-pad.css';

export type Figures = Partial<Record<SinpoLetter, SinpoGrade>>;

const GRADES = [5, 4, 3, 2, 1] as const;

type ScorePadProps = {
  /** The figures that count: touched here, or saved before. */
  readonly figures: Figures;
  /** Figures of the entry before, shown as outlines until they are touched. */
  readonly outlined?: Figures | null;
  /** Asked with X when a chosen cell is tapped again. */
  readonly onFigure: (letter: SinpoLetter, grade: SinpoGrade) => void;
};

/**
 * Five columns of five cells, each at least 56 px high and 48 px wide: five taps score a signal. From a keyboard,
 * 1 to 5 and X fill the column in focus and go on to the next; the arrow keys move.
 */
export function ScorePad({ figures, outlined, onFigure }: ScorePadProps) {
  const pad = useRef<HTMLDivElement>(null);
  const focusOn = (letter: SinpoLetter | undefined, grade: SinpoGrade): void => {
    const cell = letter && pad.current?.querySelector<HTMLElement>(`[data-cell="${letter}${grade}"]`);
    if (cell) cell.focus();
  };
  const press = (letter: SinpoLetter, event: KeyboardEvent): void => {
    const grade = gradeOfKey(event.key);
    if (grade === null) return;
    event.preventDefault();
    onFigure(letter, grade);
    const next = SINPO_LETTERS[SINPO_LETTERS.indexOf(letter) + 1];
    focusOn(next, grade === 'X' ? 3 : grade);
  };
  const move = (letter: SinpoLetter, grade: number, event: KeyboardEvent): void => {
    const column = SINPO_LETTERS.indexOf(letter);
    const aside = { ArrowLeft: -1, ArrowRight: 1 }[event.key];
    const up = { ArrowUp: 1, ArrowDown: -1 }[event.key];
    if (aside === undefined && up === undefined) return;
    event.preventDefault();
    const nextGrade = Math.min(5, Math.max(1, grade + (up ?? 0))) as SinpoGrade;
    focusOn(SINPO_LETTERS[column + (aside ?? 0)], nextGrade);
  };
  return (
    <div className="hm-pad" ref={pad}>
      {SINPO_LETTERS.map((letter) => (
        <div
          key={letter}
          role="radiogroup"
          aria-label={SINPO_NAMES[letter]}
          className="hm-pad-column"
          onKeyDown={(event) => press(letter, event)}
        >
          <div className="hm-pad-head" aria-hidden="true">
            {letter.toUpperCase()}
            <small>{SINPO_NAMES[letter]}</small>
          </div>
          {GRADES.map((grade) => (
            <Cell
              key={grade}
              {...{ letter, grade }}
              state={stateOf(figures[letter], outlined?.[letter], grade)}
              isTabStop={grade === tabStop(figures[letter])}
              onTap={() => onFigure(letter, figures[letter] === grade ? 'X' : grade)}
              onMove={(event) => move(letter, grade, event)}
            />
          ))}
        </div>
      ))}
    </div>
  );
}

type CellProps = {
  readonly letter: SinpoLetter;
  readonly grade: Exclude<SinpoGrade, 'X'>;
  readonly state: 'chosen' | 'outlined' | 'plain';
  readonly isTabStop: boolean;
  readonly onTap: () => void;
  readonly onMove: (event: KeyboardEvent) => void;
};

function Cell({ letter, grade, state, isTabStop, onTap, onMove }: CellProps) {
  const meaning = SINPO_MEANINGS[letter][grade];
  const name = `${SINPO_NAMES[letter]} ${grade}, ${meaning}`;
  return (
    <button
      type="button"
      role="radio"
      data-cell={`${letter}${grade}`}
      aria-checked={state === 'chosen'}
      aria-label={state === 'outlined' ? `${name}, as in the entry before` : name}
      tabIndex={isTabStop ? 0 : -1}
      className={`hm-pad-cell hm-pad-${state}`}
      onClick={onTap}
      onKeyDown={onMove}
    >
      {grade}
    </button>
  );
}

function stateOf(
  figure: SinpoGrade | undefined,
  outlined: SinpoGrade | undefined,
  grade: number,
): CellProps['state'] {
  if (figure === grade) return 'chosen';
  return figure === undefined && outlined === grade ? 'outlined' : 'plain';
}

/** One stop for the Tab key in each column: the chosen cell, else the middle one. */
function tabStop(figure: SinpoGrade | undefined): number {
  return typeof figure === 'number' ? figure : 3;
}

function gradeOfKey(key: string): SinpoGrade | null {
  if (/^[1-5]$/.test(key)) return Number(key) as SinpoGrade;
  return /^x$/i.test(key) ? 'X' : null;
}
