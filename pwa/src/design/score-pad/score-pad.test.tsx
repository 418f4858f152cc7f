// @vitest-environment jsdom
import { useState } from 'react';
import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, it } from 'vitest';
import { GradeWords } from './GradeWords';
import { ScorePad, type Figures } from './ScorePad';

afterEach(cleanup);

function Pad({ outlined = null }: { outlined?: Figures | null }) {
  const [figures, setFigures] = useState<Figures>({});
  return (
    <>
      <ScorePad
        figures={figures}
        outlined={outlined}
        onFigure={(letter, grade) => setFigures((known) => ({ ...known, [letter]: grade }))}
      />
      <GradeWords figures={figures} touched="p" hasOutlines={outlined !== null} />
      <span>{['s', 'i', 'n', 'p', 'o'].map((letter) => figures[letter as 's'] ?? '-').join('')}</span>
    </>
  );
}

const shown = () => screen.getByText(/^[-X1-5]{5}$/).textContent;

it('should score a signal with five taps and say the last grade in words', async () => {
  render(<Pad />);
  for (const name of [/^strength 4/, /^interference 4/, /^noise 3/, /^propagation 3/]) {
    await userEvent.click(screen.getByRole('radio', { name }));
  }
  expect(shown()).toBe('4433-');
  expect(screen.getByRole('status').textContent).toBe('P 3 moderate fading or echo. Now the overall score.');
});

it('should take a figure back at a second tap', async () => {
  render(<Pad />);
  const cell = screen.getByRole('radio', { name: /^strength 4/ });
  await userEvent.click(cell);
  expect(cell.getAttribute('aria-checked')).toBe('true');
  await userEvent.click(cell);
  expect(shown()).toBe('X----');
});

it('should be filled from a keyboard: five figures in a row', async () => {
  render(<Pad />);
  screen.getByRole('radio', { name: /^strength 3/ }).focus();
  await userEvent.keyboard('4543x');
  expect(shown()).toBe('4543X');
});

it('should never show an outlined figure as chosen', () => {
  render(<Pad outlined={{ s: 4, i: 4, n: 3, p: 3, o: 3 }} />);
  expect(screen.getAllByRole('radio', { name: /as in the entry before/ })).toHaveLength(5);
  expect(screen.queryAllByRole('radio', { checked: true })).toEqual([]);
});
