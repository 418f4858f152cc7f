import type { Position } from '@harkmoor/sync-model/radio/position';
import { twilightAt } from '@harkmoor/sync-model/radio/sun/sun';
import type { RimPart } from '../../../design/charts/DialRim';

const STEP_MIN = 10;
const STEPS = (24 * 60) / STEP_MIN;

/**
 * Day, twilight and night of a place over the 24 hours of a UTC date, to ten minutes, in order; the three twilights
 * are one. The first part begins at 0 and the last ends at 24.
 */
export function sunParts(position: Position, dayMs: number): RimPart[] {
  const parts: { fromHour: number; toHour: number; light: RimPart['light'] }[] = [];
  for (let step = 0; step < STEPS; step++) {
    const light = lightAt(position, dayMs + (step + 0.5) * STEP_MIN * 60_000);
    const fromHour = (step * STEP_MIN) / 60;
    const last = parts.at(-1);
    if (last?.light === light) last.toHour = fromHour + STEP_MIN / 60;
    else parts.push({ fromHour, toHour: fromHour + STEP_MIN / 60, light });
  }
  return parts;
}

/** "day", "twilight" or "night" at an hour of day (fractions too) by parts of `sunParts`. */
export function lightAtHour(parts: readonly RimPart[], hour: number): RimPart['light'] | null {
  return parts.find(({ fromHour, toHour }) => hour >= fromHour && hour < toHour)?.light ?? null;
}

function lightAt(position: Position, atMs: number): RimPart['light'] {
  const twilight = twilightAt(position, atMs);
  return twilight === 'day' || twilight === 'night' ? twilight : 'twilight';
}
