import { isInView, rectPx, worldCopies, type CanvasView } from './canvas-view';
import type { Land, LandRing } from './land';
import type { MapPalette } from './palette';
import { landAtZoom } from './simplify-land';

/** Fills the land; the water is the ground of the map. */
export function paintLand(
  context: CanvasRenderingContext2D,
  view: CanvasView,
  land: Land,
  palette: MapPalette,
): void {
  context.beginPath();
  const simple = landAtZoom(land, view.zoom);
  // a ring that runs past 180° reaches into the next copy of the world
  const copies = worldCopies(view).flatMap((copy) => [copy - 1, copy, copy + 1]);
  for (const copy of new Set(copies)) {
    for (const ring of simple) {
      if (isInView(rectPx(ring.box, view, copy), view)) traceRing(context, ring, view, copy);
    }
  }
  context.fillStyle = palette.land;
  context.fill('evenodd');
  context.strokeStyle = palette.coast;
  context.lineWidth = 1;
  context.stroke();
}

/** Which sides of the view a point lies beyond, as bits: left 1, right 2, above 4, below 8 (Cohen and Sutherland). */
function beyond(x: number, y: number, { widthPx, heightPx }: CanvasView): number {
  return (x < -2 ? 1 : x > widthPx + 2 ? 2 : 0) | (y < -2 ? 4 : y > heightPx + 2 ? 8 : 0);
}

/** Traces a ring, passing over points that lie beyond one side together with both their neighbours. */
export function traceRing(
  context: Pick<CanvasRenderingContext2D, 'moveTo' | 'lineTo' | 'closePath'>,
  { points }: LandRing,
  view: CanvasView,
  copy: number,
): void {
  const { worldPx, originX, originY } = view;
  const xAt = (at: number) => (points[at]! + copy) * worldPx - originX;
  const yAt = (at: number) => points[at + 1]! * worldPx - originY;
  let [x, y] = [xAt(0), yAt(0)];
  let lastKept = beyond(x, y, view);
  context.moveTo(x, y);
  let [nextX, nextY] = [xAt(2), yAt(2)];
  let next = beyond(nextX, nextY, view);
  for (let at = 2; at < points.length; at += 2) {
    [x, y] = [nextX, nextY];
    const here = next;
    if (at + 2 < points.length) {
      [nextX, nextY] = [xAt(at + 2), yAt(at + 2)];
      next = beyond(nextX, nextY, view);
      if ((lastKept & here & next) !== 0) continue;
    }
    lastKept = here;
    context.lineTo(x, y);
  }
  context.closePath();
}
