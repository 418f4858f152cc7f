import type { Theme } from '../theme/theme';

/** The colours of the map as CSS colours, read from the tokens: a canvas knows no custom properties. */
export type MapPalette = {
  readonly theme: Theme;
  readonly land: string;
  readonly coast: string;
  readonly ink: string;
  readonly paper: string;
  readonly border: string;
  readonly terminator: string;
  readonly night: string;
  readonly nightOpacity: number;
};

/** The tokens of the theme that is on the screen. */
export function readPalette(theme: Theme): MapPalette {
  const style = getComputedStyle(document.documentElement);
  const token = (name: string, fallback: string) => style.getPropertyValue(name).trim() || fallback;
  return {
    theme,
    land: token('--land', '#efe9dc'),
    coast: token('--rule', '#e2dacc'),
    ink: token('--ink', '#231b14'),
    paper: token('--paper', '#faf7f0'),
    border: token('--control-border', '#8a7f70'),
    terminator: token('--loch', '#22586b'),
    night: token('--night-shade', '#22586b'),
    nightOpacity: Number(token('--night-shade-opacity', '0.22')),
  };
}
