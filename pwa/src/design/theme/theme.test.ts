// @vitest-environment jsdom
import { beforeEach, describe, expect, test } from 'vitest';
import FIRST_SCRIPT from '../../../public/theme.js?raw';
import TOKENS from '../tokens.css?raw';
import { channelsOf, contrastRatio } from './contrast';
import { currentTheme, nextTheme, setTheme, THEME_KEY, themeChoice, type ThemeChoice } from './theme';

/** The colours that a theme's block of tokens.css names. */
function tokensOf(theme: string): ReadonlyMap<string, string> {
  const block = TOKENS.split(`data-theme='${theme}'] {`)[1]?.split('}')[0] ?? '';
  return new Map([...block.matchAll(/--([a-z-]+): (#[0-9a-f]{6});/g)].map((match) => [match[1]!, match[2]!]));
}

function lookOfPage() {
  const root = document.documentElement;
  return {
    theme: root.dataset['theme'],
    background: root.style.backgroundColor,
    scheme: root.style.colorScheme,
    bar: document.querySelector('meta[name="theme-color"]')?.getAttribute('content'),
  };
}

function setSystem(isDark: boolean): void {
  window.matchMedia = (query: string) =>
    Object.assign(new EventTarget(), { matches: isDark, media: query }) as MediaQueryList;
}

beforeEach(() => {
  localStorage.clear();
  document.head.innerHTML = '<meta name="theme-color" content="#123456">';
  document.documentElement.removeAttribute('style');
  delete document.documentElement.dataset['theme'];
});

describe('the first painted frame', () => {
  const choices: (ThemeChoice | 'something older')[] = [
    'day',
    'dusk',
    'red-night',
    'system',
    'something older',
  ];
  for (const choice of choices) {
    for (const isDark of [false, true]) {
      test(`should look as the application will: ${choice}, ${isDark ? 'dark' : 'light'} system`, () => {
        setSystem(isDark);
        localStorage.setItem(THEME_KEY, choice);
        window.eval(FIRST_SCRIPT);
        const first = lookOfPage();
        setTheme(themeChoice());
        expect(first).toEqual(lookOfPage());
        expect(first.theme).toBe(currentTheme());
      });
    }
  }

  test('should be black in red night', () => {
    setSystem(false);
    localStorage.setItem(THEME_KEY, 'red-night');
    window.eval(FIRST_SCRIPT);
    expect(lookOfPage()).toEqual({
      theme: 'red-night',
      background: 'rgb(0, 0, 0)',
      scheme: 'dark',
      bar: '#000000',
    });
  });
});

test('should come back to day after three taps on the theme key', () => {
  expect(nextTheme(nextTheme(nextTheme('day')))).toBe('day');
});

describe('the tokens', () => {
  test('should use only the red channel in red night', () => {
    const colours = [...tokensOf('red-night').values()];
    expect(colours.length).toBeGreaterThan(15);
    for (const colour of colours) {
      const [, green, blue] = channelsOf(colour);
      expect(Math.max(green, blue)).toBeLessThanOrEqual(8);
    }
  });

  test('should keep day text at 7:1 and control borders at 3:1', () => {
    const day = tokensOf('day');
    for (const ground of ['paper', 'raised']) {
      for (const text of ['ink', 'soft-ink', 'heather', 'link', 'bracken', 'lichen']) {
        expect(
          contrastRatio(day.get(text)!, day.get(ground)!),
          `${text} on ${ground}`,
        ).toBeGreaterThanOrEqual(7);
      }
      expect(contrastRatio(day.get('control-border')!, day.get(ground)!)).toBeGreaterThanOrEqual(3);
    }
  });

  test('should keep dusk and red night text at 4.5:1', () => {
    for (const theme of ['dusk', 'red-night']) {
      const tokens = tokensOf(theme);
      for (const text of ['ink', 'soft-ink', 'heather', 'link', 'bracken', 'lichen']) {
        const ratio = contrastRatio(tokens.get(text)!, tokens.get('raised')!);
        expect(ratio, `${text} in ${theme}`).toBeGreaterThanOrEqual(4.5);
      }
    }
  });

  // WCAG 2.2, "contrast ratio": black on white is 21:1
  test('should measure black on white as 21:1', () => {
    expect(contrastRatio('#000000', 'rgb(255, 255, 255)')).toBeCloseTo(21, 6);
  });
});
