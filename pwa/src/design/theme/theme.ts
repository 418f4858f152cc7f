import { useSyncExternalStore } from 'react';

/** A look of the application. `red-night` keeps dark-adapted eyes: red channel only. */
export type Theme = 'day' | 'dusk' | 'red-night';
/** What a person chose; `system` follows the device's light or dark setting. */
export type ThemeChoice = Theme | 'system';

export const THEME_KEY = 'harkmoor.theme';
const PAPERS: Readonly<Record<Theme, string>> = { day: '#FAF7F0', dusk: '#17130F', 'red-night': '#000000' };
const listeners = new Set<() => void>();

/** The stored choice; `system` where nothing was chosen or storage is refused. */
export function themeChoice(): ThemeChoice {
  try {
    const stored = localStorage.getItem(THEME_KEY);
    return stored !== null && stored in PAPERS ? (stored as Theme) : 'system';
  } catch {
    return 'system';
  }
}

/** The theme that is on the screen now. */
export function currentTheme(): Theme {
  const choice = themeChoice();
  if (choice !== 'system') return choice;
  return window.matchMedia('(prefers-color-scheme: dark)').matches ? 'dusk' : 'day';
}

/** Changes the look at once and keeps the choice for the next opening. Returns false where the choice cannot be kept. */
export function setTheme(choice: ThemeChoice): boolean {
  let isKept = true;
  try {
    localStorage.setItem(THEME_KEY, choice);
  } catch {
    isKept = false;
  }
  paint(choice === 'system' ? currentTheme() : choice);
  for (const listener of listeners) listener();
  return isKept;
}

/** The theme key of the clock row: day or dusk to red night, and back to what was there before. */
export function nextTheme(theme: Theme): Theme {
  return theme === 'day' ? 'dusk' : theme === 'dusk' ? 'red-night' : 'day';
}

/** The theme on the screen, for drawings that must know it (canvas, map). */
export function useTheme(): Theme {
  return useSyncExternalStore(subscribe, currentTheme);
}

/** What was chosen, for the settings screen. */
export function useThemeChoice(): ThemeChoice {
  return useSyncExternalStore(subscribe, themeChoice);
}

/** Follows the system and other tabs for as long as the page lives. */
export function followTheme(): void {
  const repaint = (): void => {
    paint(currentTheme());
    for (const listener of listeners) listener();
  };
  window.matchMedia('(prefers-color-scheme: dark)').addEventListener('change', repaint);
  window.addEventListener('storage', (event) => {
    if (event.key === THEME_KEY) repaint();
  });
}

function paint(theme: Theme): void {
  const root = document.documentElement;
  root.dataset.theme = theme;
  root.style.backgroundColor = PAPERS[theme];
  root.style.colorScheme = theme === 'day' ? 'light' : 'dark';
  document.querySelector('meta[name="theme-color"]')?.setAttribute('content', PAPERS[theme]);
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}
