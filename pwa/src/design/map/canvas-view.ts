import type { WorldRect } from './mercator';

/** The part of the world that a canvas shows. */
export type CanvasView = {
  readonly zoom: number;
  /** Pixels of the whole world at this zoom. */
  readonly worldPx: number;
  /** Where the canvas begins, in pixels of the world; may lie beyond its edges. */
  readonly originX: number;
  readonly originY: number;
  readonly widthPx: number;
  readonly heightPx: number;
};

export type Paint = (context: CanvasRenderingContext2D, view: CanvasView) => void;

/** The copies of the world that a view shows: 0 is the one from 180° W to 180° E, −1 the one to its west. */
export function worldCopies({ originX, widthPx, worldPx }: CanvasView): number[] {
  const first = Math.floor(originX / worldPx);
  const last = Math.floor((originX + widthPx) / worldPx);
  return Array.from({ length: last - first + 1 }, (_, step) => first + step);
}

/** A rectangle of the world in pixels of the canvas, in one copy of the world. */
export function rectPx(rect: WorldRect, { originX, originY, worldPx }: CanvasView, copy: number): WorldRect {
  return {
    x0: (rect.x0 + copy) * worldPx - originX,
    y0: rect.y0 * worldPx - originY,
    x1: (rect.x1 + copy) * worldPx - originX,
    y1: rect.y1 * worldPx - originY,
  };
}

export function isInView({ x0, y0, x1, y1 }: WorldRect, { widthPx, heightPx }: CanvasView): boolean {
  return x1 >= 0 && y1 >= 0 && x0 <= widthPx && y0 <= heightPx;
}
