// @vitest-environment jsdom
import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { HourDial, type DialRingFigures } from './HourDial';

beforeEach(() => {
  // jsdom has no media queries; the dial asks them for the theme
  vi.stubGlobal('matchMedia', () => ({ matches: false, addEventListener() {}, removeEventListener() {} }));
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
  delete document.documentElement.dataset.theme;
  localStorage.clear();
});

const ring = (key: string, share: number, isThin = false): DialRingFigures => ({
  key,
  label: key,
  cells: Array.from({ length: 24 }, (_, hour) => ({
    share: hour === 12 ? share : null,
    isThin,
    isTried: hour === 12,
    words: hour === 12 ? `${share * 100} % heard, 8 of 10 on 4 dates` : 'Nothing was tried here.',
  })),
});

describe('the hour dial by keyboard', () => {
  it('should say each cell with its hour, figure and sample', async () => {
    render(
      <HourDial
        label="Hour dial"
        title="JO46ac"
        note="10 obs."
        rings={[ring('49 m', 0.8), ring('31 m', 0.4)]}
        rim={[]}
      />,
    );
    await userEvent.tab();
    await userEvent.keyboard('{ArrowRight}');
    expect(screen.getByRole('status').textContent).toBe('31 m, 12–13 UTC: 40 % heard, 8 of 10 on 4 dates');
    await userEvent.keyboard('{ArrowDown}');
    expect(screen.getByRole('status').textContent).toBe('49 m, 12–13 UTC: 80 % heard, 8 of 10 on 4 dates');
    await userEvent.keyboard('{ArrowLeft}');
    expect(screen.getByRole('status').textContent).toBe('49 m, 11–12 UTC: Nothing was tried here.');
  });
});

describe('the hour dial in red night', () => {
  it('should print the rate in tens in each cell with a figure', () => {
    localStorage.setItem('harkmoor.theme', 'red-night');
    const { container } = render(
      <HourDial
        label="Hour dial"
        title="JO46ac"
        note="10 obs."
        rings={[ring('49 m', 0.8), ring('31 m', 0.4, true)]}
        rim={[]}
      />,
    );
    const printed = [...container.querySelectorAll('.hm-dial-print')].map(({ textContent }) => textContent);
    expect(printed).toEqual(['8', '4']);
    expect(container.querySelector('.hm-dial-print-thin')?.textContent).toBe('4');
  });
});
