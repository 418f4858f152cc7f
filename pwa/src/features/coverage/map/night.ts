import { nightRing } from '@harkmoor/sync-model/radio/sun/night-area';
import type { Overview } from '../answers/questions';
import { isAllHours, middleOfDayMs } from '../view/hour-range';
import { middleDayMs } from '../view/months';
import { shownMonths } from '../view/scope-words';
import type { CoverageView } from '../view/coverage-view';
import { worldCopies, type CanvasView } from '../../../design/map/canvas-view';
import { worldX, worldY, type WorldPoint } from '../../../design/map/mercator';
import type { MapPalette } from '../../../design/map/palette';

const STEP_DEG = 1;

/** The dark side at one moment. */
export type Night = {
  readonly atMs: number;
  readonly area: readonly WorldPoint[];
  readonly terminator: readonly WorldPoint[];
};

/**
 * The moment for which night is drawn: the middle hour of the hours on the middle day of the months. Null where all
 * hours are shown, for then no half of the Earth is the dark one, or where there is no date.
 */
export function nightMoment(view: CoverageView, overview: Overview): number | null {
  if (isAllHours(view.hours)) return null;
  const dayMs = middleDayMs(shownMonths(view, overview));
  return dayMs === null ? null : dayMs + middleOfDayMs(view.hours);
}

export function nightAt(atMs: number): Night {
  const ring = nightRing(atMs, STEP_DEG);
  const area = ring.map(({ latDeg, lonDeg }) => ({ x: worldX(lonDeg), y: worldY(latDeg) }));
  // the ring ends with the two corners of the dark pole and its first point again
  return { atMs, area, terminator: area.slice(0, -3) };
}

/** The shade of night and its edge, dashed: below the squares. */
export function paintNight(
  context: CanvasRenderingContext2D,
  view: CanvasView,
  { area, terminator }: Night,
  palette: MapPalette,
): void {
  for (const copy of worldCopies(view)) {
    trace(context, view, area, copy);
    context.globalAlpha = palette.nightOpacity;
    context.fillStyle = palette.night;
    context.fill();
    context.globalAlpha = 1;
    trace(context, view, terminator, copy);
    context.setLineDash([5, 4]);
    context.strokeStyle = palette.terminator;
    context.lineWidth = 1.5;
    context.stroke();
    context.setLineDash([]);
  }
}

function trace(
  context: CanvasRenderingContext2D,
  { worldPx, originX, originY }: CanvasView,
  points: readonly WorldPoint[],
  copy: number,
): void {
  context.beginPath();
  for (const { x, y } of points) context.lineTo((x + copy) * worldPx - originX, y * worldPx - originY);
}
