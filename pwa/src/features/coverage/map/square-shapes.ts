import { locatorOf, squareOf } from '@harkmoor/sync-model/radio/locator/locator';
import type { SquareCharacters } from '@harkmoor/sync-model/evidence/squares';
import type { SquareFigures } from '../answers/questions';
import type { Measure } from '../view/coverage-view';
import { MAP_LAT_MAX_DEG, worldX, worldY, type WorldRect } from '../../../design/map/mercator';
import { fillOf, largestCount, type Fill } from './square-scale';

/** A square ready to be painted. */
export type SquareShape = {
  readonly figures: SquareFigures;
  readonly rect: WorldRect;
  readonly fill: Fill;
};

/** The squares of a map for painting, those with dashed outlines first, so that finer ones lie above. */
export function squareShapes(squares: readonly SquareFigures[], measure: Measure): SquareShape[] {
  const largestN = largestCount(squares);
  return [...squares]
    .sort((a, b) => Number(b.coarseOnly) - Number(a.coarseOnly))
    .map((figures) => ({
      figures,
      rect: rectOf(figures.locator),
      fill: fillOf(figures, measure, largestN),
    }));
}

/** The square of a locator in the map's own measure. */
export function rectOf(locator: string): WorldRect {
  const { southDeg, westDeg, northDeg, eastDeg } = squareOf(locator);
  return { x0: worldX(westDeg), y0: worldY(northDeg), x1: worldX(eastDeg), y1: worldY(southDeg) };
}

/** The square with data at a point of the map: the finest one; null where there is none. */
export function squareAt(
  squares: readonly SquareFigures[],
  position: { readonly latDeg: number; readonly lonDeg: number },
  characters: SquareCharacters,
): SquareFigures | null {
  if (Math.abs(position.latDeg) > MAP_LAT_MAX_DEG) return null;
  const finest = locatorOf({ latDeg: position.latDeg, lonDeg: wrapped(position.lonDeg) }, characters);
  for (let length = finest.length; length >= 2; length -= 2) {
    const found = squares.find(({ locator }) => locator === finest.slice(0, length));
    if (found) return found;
  }
  return null;
}

function wrapped(lonDeg: number): number {
  return ((((lonDeg + 180) % 360) + 360) % 360) - 180;
}
