import { rampOf, textOnRamp } from '../../../design/scale/cividis';
import { isInView, rectPx, worldCopies, type CanvasView } from '../../../design/map/canvas-view';
import type { WorldRect } from '../../../design/map/mercator';
import type { MapPalette } from '../../../design/map/palette';
import { rectOf, type SquareShape } from './square-shapes';

/** The share of a thin square's sides that is left blank at each edge. */
const THIN_INSET = 0.25;
const PRINT_HEIGHT_PX_MIN = 12;
const SIDE_PX_MIN = 4;

export type Marks = { readonly selected: string | null; readonly cursor: string | null };

/** The squares, and over them the outline of the chosen one and of the keyboard's. */
export function paintSquares(
  context: CanvasRenderingContext2D,
  view: CanvasView,
  shapes: readonly SquareShape[],
  palette: MapPalette,
): void {
  const ramp = rampOf(palette.theme);
  for (const copy of worldCopies(view)) {
    for (const shape of shapes) {
      const rect = rectPx(shape.rect, view, copy);
      if (isInView(rect, view)) paintSquare(context, rect, shape, palette, ramp);
    }
  }
}

/** Outlines in ink: whole for the chosen square, dashed for the one under the keyboard's cursor. */
export function paintMarks(
  context: CanvasRenderingContext2D,
  view: CanvasView,
  { selected, cursor }: Marks,
  palette: MapPalette,
): void {
  for (const copy of worldCopies(view)) {
    if (selected !== null) mark(context, rectPx(rectOf(selected), view, copy), palette, []);
    if (cursor !== null && cursor !== selected) {
      mark(context, rectPx(rectOf(cursor), view, copy), palette, [6, 3]);
    }
  }
}

/** An outline outside the square with paper under it: in red night the square itself is as red as the ink. */
function mark(
  context: CanvasRenderingContext2D,
  { x0, y0, x1, y1 }: WorldRect,
  palette: MapPalette,
  dash: number[],
): void {
  const outside = { x0: x0 - 2, y0: y0 - 2, x1: x1 + 2, y1: y1 + 2 };
  outline(context, outside, palette.paper, 6, []);
  outline(context, outside, palette.ink, 3, dash);
}

function paintSquare(
  context: CanvasRenderingContext2D,
  rect: WorldRect,
  { figures, fill }: SquareShape,
  palette: MapPalette,
  ramp: (share: number) => string,
): void {
  const box = innerBox(rect, fill.isThin && !figures.coarseOnly);
  if (fill.share === null) {
    outline(context, innerBox(rect, true), palette.border, 1.5, figures.coarseOnly ? [4, 3] : []);
    return;
  }
  if (figures.coarseOnly) {
    // a fine line below the dashes, for the brightest and the darkest of them vanish on their grounds
    outline(context, rect, palette.border, 1, []);
    outline(context, rect, ramp(fill.share), fill.isThin ? 2 : 4, [8, 5]);
  } else {
    context.fillStyle = ramp(fill.share);
    context.fillRect(box.x0, box.y0, box.x1 - box.x0, box.y1 - box.y0);
  }
  if (palette.theme === 'red-night')
    print(context, figures.coarseOnly ? rect : box, figures.coarseOnly, fill);
}

function innerBox({ x0, y0, x1, y1 }: WorldRect, isThin: boolean): WorldRect {
  const [width, height] = [x1 - x0, y1 - y0];
  const dx = isThin ? Math.min(width * THIN_INSET, (width - SIDE_PX_MIN) / 2) : Math.min(1, width / 8);
  const dy = isThin ? Math.min(height * THIN_INSET, (height - SIDE_PX_MIN) / 2) : Math.min(1, height / 8);
  return { x0: x0 + dx, y0: y0 + dy, x1: x1 - dx, y1: y1 - dy };
}

/** In red night colour tells too little: the figure stands in the cell, or in the corner of an outline. */
function print(
  context: CanvasRenderingContext2D,
  box: WorldRect,
  isOutline: boolean,
  { share, print: text }: SquareShape['fill'],
): void {
  const height = box.y1 - box.y0;
  if (share === null || height < PRINT_HEIGHT_PX_MIN) return;
  const fontPx = Math.max(12, Math.min(20, Math.round(height * 0.6)));
  context.font = `800 ${fontPx}px Nunito, sans-serif`;
  context.textAlign = isOutline ? 'left' : 'center';
  context.textBaseline = isOutline ? 'top' : 'middle';
  context.fillStyle = isOutline ? '#FF0606' : textOnRamp(share, 'red-night');
  if (isOutline) context.fillText(text, box.x0 + 6, box.y0 + 6);
  else context.fillText(text, (box.x0 + box.x1) / 2, (box.y0 + box.y1) / 2 + 1);
}

function outline(
  context: CanvasRenderingContext2D,
  { x0, y0, x1, y1 }: WorldRect,
  colour: string,
  widthPx: number,
  dash: number[],
): void {
  context.setLineDash(dash);
  context.strokeStyle = colour;
  context.lineWidth = widthPx;
  context.strokeRect(x0, y0, x1 - x0, y1 - y0);
  context.setLineDash([]);
}
