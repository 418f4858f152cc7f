import { assertPosition, wrapLonDeg, type Position } from '../position.js';

export type LocatorCharacters = 2 | 4 | 6 | 8;
export type LocatorSquare = { southDeg: number; westDeg: number; northDeg: number; eastDeg: number };

/** Steps of the finest pair in a degree: 1/120° of longitude (30″) and 1/240° of latitude (15″). */
const LON_STEPS_PER_DEG = 120;
const LAT_STEPS_PER_DEG = 240;
const STEPS = 43_200;
/** Steps in a cell of each length, the same both ways: field 2 400, square 240, subsquare 10, extended 1. */
const STEPS_IN_CELL: Record<LocatorCharacters, number> = { 2: 2400, 4: 240, 6: 10, 8: 1 };
/** A tenth of a millimetre: keeps a corner that binary fractions miss by a hair in its own cell. */
const EDGE_DEG = 1e-9;
const PATTERN = /^[A-R]{2}(?:[0-9]{2}(?:[a-x]{2}(?:[0-9]{2})?)?)?$/;

/**
 * The Maidenhead locator of a point, "JO46ac", of 2, 4, 6 or 8 characters: fields of 20° × 10°, squares of
 * 2° × 1°, subsquares of 5′ × 2.5′, extended squares of 30″ × 15″, longitude first. A point on an edge
 * belongs to the cell to its north and east; the north pole to the top row; +180° is −180°.
 */
export function locatorOf(position: Position, characters: LocatorCharacters): string {
  assertPosition(position);
  const lonStep = Math.floor((wrapLonDeg(position.lonDeg) + 180 + EDGE_DEG) * LON_STEPS_PER_DEG) % STEPS;
  const latStep = Math.min(Math.floor((position.latDeg + 90 + EDGE_DEG) * LAT_STEPS_PER_DEG), STEPS - 1);
  const pairs = [
    letter(65, Math.floor(lonStep / 2400)) + letter(65, Math.floor(latStep / 2400)),
    `${Math.floor(lonStep / 240) % 10}${Math.floor(latStep / 240) % 10}`,
    letter(97, Math.floor(lonStep / 10) % 24) + letter(97, Math.floor(latStep / 10) % 24),
    `${lonStep % 10}${latStep % 10}`,
  ];
  return pairs.slice(0, characters / 2).join('');
}

/** True for text that `normaliseLocator` can read. */
export function isLocator(text: string): boolean {
  return normaliseLocator(text) !== undefined;
}

/** The usual spelling, "AA00aa00", of a locator of 2 to 8 characters typed in any case; undefined where it is none. */
export function normaliseLocator(text: string): string | undefined {
  const trimmed = text.trim();
  const spelt = trimmed.slice(0, 2).toUpperCase() + trimmed.slice(2).toLowerCase();
  return PATTERN.test(spelt) ? spelt : undefined;
}

/** The edges of a locator's cell, in degrees. Throws on text that is no locator. */
export function squareOf(locator: string): LocatorSquare {
  const { lonStep, latStep, steps } = cellOf(locator);
  return {
    southDeg: latStep / LAT_STEPS_PER_DEG - 90,
    westDeg: lonStep / LON_STEPS_PER_DEG - 180,
    northDeg: (latStep + steps) / LAT_STEPS_PER_DEG - 90,
    eastDeg: (lonStep + steps) / LON_STEPS_PER_DEG - 180,
  };
}

/** The middle of a locator's cell, in degrees. Throws on text that is no locator. */
export function centreOf(locator: string): Position {
  const { lonStep, latStep, steps } = cellOf(locator);
  return {
    latDeg: (latStep + steps / 2) / LAT_STEPS_PER_DEG - 90,
    lonDeg: (lonStep + steps / 2) / LON_STEPS_PER_DEG - 180,
  };
}

/** The cell of at most so many characters that holds this one; a coarser locator stays. Throws on text that is none. */
export function coarser(locator: string, characters: LocatorCharacters): string {
  return normalised(locator).slice(0, characters);
}

function cellOf(locator: string): { lonStep: number; latStep: number; steps: number } {
  const text = normalised(locator).toUpperCase();
  const digit = (index: number, zero: number) => (index < text.length ? text.charCodeAt(index) - zero : 0);
  const stepOf = (first: 0 | 1) =>
    digit(first, 65) * 2400 + digit(first + 2, 48) * 240 + digit(first + 4, 65) * 10 + digit(first + 6, 48);
  return {
    lonStep: stepOf(0),
    latStep: stepOf(1),
    steps: STEPS_IN_CELL[text.length as LocatorCharacters],
  };
}

function normalised(locator: string): string {
  const text = normaliseLocator(locator);
  if (text === undefined) throw new Error(`"${locator}" is no locator.`);
  return text;
}

function letter(base: number, index: number): string {
  return String.fromCharCode(base + index);
}
