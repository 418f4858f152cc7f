import type { Land, LandRing } from './land';
import { worldSizePx } from './mercator';

/** Points closer together than this on the screen are one. */
const STEP_PX = 0.8;
/** A ring smaller than this on the screen is left out. */
const RING_PX_MIN = 1;

const kept = new WeakMap<Land, Map<number, Land>>();

/** The land with as many points as a whole zoom can show; worked out once for each. */
export function landAtZoom(land: Land, zoom: number): Land {
  const whole = Math.max(0, Math.ceil(zoom));
  let byZoom = kept.get(land);
  if (!byZoom) kept.set(land, (byZoom = new Map()));
  let simple = byZoom.get(whole);
  if (!simple) byZoom.set(whole, (simple = simplified(land, worldSizePx(whole))));
  return simple;
}

function simplified(land: Land, worldPx: number): Land {
  return land
    .filter(({ box }) => Math.max(box.x1 - box.x0, box.y1 - box.y0) * worldPx >= RING_PX_MIN)
    .map((ring) => thinned(ring, STEP_PX / worldPx));
}

/** Drops points nearer than `step` to the last one kept; first and last stay, so that a ring stays closed. */
function thinned({ points, box }: LandRing, step: number): LandRing {
  const kept: number[] = [points[0]!, points[1]!];
  let [x, y] = [points[0]!, points[1]!];
  for (let at = 2; at < points.length; at += 2) {
    const isFar = Math.abs(points[at]! - x) >= step || Math.abs(points[at + 1]! - y) >= step;
    if (!isFar && at < points.length - 2) continue;
    x = points[at]!;
    y = points[at + 1]!;
    kept.push(x, y);
  }
  return { points: Float64Array.from(kept), box };
}
