import type { Theme } from '../theme/theme';

type Rgb = readonly [number, number, number];

/**
 * Eight stops of cividis (Nuñez, Anderton and Renslow 2018), which stays in order for colour-vision deficiency and in
 * grey; straight lines between them.
 */
const STOPS: readonly Rgb[] = [
  [0, 32, 81],
  [33, 59, 110],
  [77, 86, 108],
  [110, 113, 115],
  [142, 140, 121],
  [178, 170, 110],
  [218, 202, 83],
  [253, 234, 69],
];

/** The darkest and the brightest red of the red-night ramp, of 255. */
const RED_FROM = 48;
const RED_TO = 255;

/** The colour of a share from 0 to 1 (clamped) as a CSS colour. */
export function cividis(share: number): string {
  return css(between(clamped(share)));
}

/** Red only, brighter with the share: for red night, where the figure also stands in the cell. */
export function redRamp(share: number): string {
  return css([Math.round(RED_FROM + (RED_TO - RED_FROM) * clamped(share)), 0, 0]);
}

/** The ramp that a theme asks for. */
export function rampOf(theme: Theme): (share: number) => string {
  return theme === 'red-night' ? redRamp : cividis;
}

/** A text colour that can be read on the ramp's colour of a share. */
export function textOnRamp(share: number, theme: Theme): string {
  if (theme === 'red-night') return clamped(share) > 0.45 ? '#000000' : '#FF0606';
  return clamped(share) > 0.5 ? '#231B14' : '#FFFFFF';
}

function between(share: number): Rgb {
  const place = share * (STOPS.length - 1);
  const low = Math.min(Math.floor(place), STOPS.length - 2);
  const [from, to] = [STOPS[low], STOPS[low + 1]];
  if (!from || !to) throw new Error(`share ${share} lies outside the ramp`);
  const mix = (a: number, b: number): number => Math.round(a + (b - a) * (place - low));
  return [mix(from[0], to[0]), mix(from[1], to[1]), mix(from[2], to[2])];
}

function clamped(share: number): number {
  if (Number.isNaN(share)) throw new Error('a share of nothing has no colour');
  return Math.min(1, Math.max(0, share));
}

function css([r, g, b]: Rgb): string {
  return `rgb(${r}, ${g}, ${b})`;
}
