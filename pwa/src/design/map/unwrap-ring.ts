import type { Position } from 'geojson';

/**
 * The outlines are not cut at 180°: a ring that crosses it jumps by 360° between two points, and a flat map draws a
 * streak across the world. Here longitudes run on past 180° instead, and a ring around a pole (Antarctica) is closed
 * along that pole.
 */
export function unwrapRing(ring: readonly Position[]): Position[] {
  let turnDeg = 0;
  let lastDeg: number | undefined;
  const unwrapped = ring.map(([lonDeg = 0, latDeg = 0]): Position => {
    if (lastDeg !== undefined && lonDeg - lastDeg > 180) turnDeg -= 360;
    if (lastDeg !== undefined && lonDeg - lastDeg < -180) turnDeg += 360;
    lastDeg = lonDeg;
    return [lonDeg + turnDeg, latDeg];
  });
  const [first, last] = [unwrapped[0], unwrapped.at(-1)];
  if (turnDeg !== 0 && first && last) {
    const poleDeg = (first[1] ?? 0) < 0 ? -90 : 90;
    unwrapped.push([last[0] ?? 0, poleDeg], [first[0] ?? 0, poleDeg], first);
  }
  return unwrapped;
}
