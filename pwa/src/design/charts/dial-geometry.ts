/**
 * Where the parts of a round 24-hour chart lie. Hour 12 stands at the top, time runs clockwise, so hour 18 is at
 * the right. All measures are in the units of the drawing; the centre is 0, 0.
 */
export type DialPoint = { readonly x: number; readonly y: number };

/** The angle of an hour (fractions too) in radians, as a drawing counts: 0 to the right, clockwise. */
export function angleOfHour(hour: number): number {
  return ((hour - 12) / 24) * 2 * Math.PI - Math.PI / 2;
}

export function pointAt(radius: number, hour: number): DialPoint {
  const angle = angleOfHour(hour);
  return { x: radius * Math.cos(angle), y: radius * Math.sin(angle) };
}

/** The inner and outer radius of a ring, the first in the middle. */
export function ringRadii(ring: number, rings: number, inner: number, outer: number): [number, number] {
  const width = (outer - inner) / rings;
  return [inner + ring * width, inner + (ring + 1) * width];
}

export type CellShape = {
  readonly fromHour: number;
  readonly toHour: number;
  readonly inner: number;
  readonly outer: number;
};

/** The outline of a cell with a gap of `gap` to each side; a thin one covers the middle half of both its measures. */
export function cellPath(cell: CellShape, gap: number, isThin: boolean): string {
  const { inner, outer, fromHour, toHour } = isThin ? shrunk(cell) : cell;
  const [ra, rb] = [inner + gap, outer - gap];
  const turn = (radius: number) => (gap / radius) * (12 / Math.PI);
  const [a, b] = [pointAt(ra, fromHour + turn(ra)), pointAt(rb, fromHour + turn(rb))];
  const [c, d] = [pointAt(rb, toHour - turn(rb)), pointAt(ra, toHour - turn(ra))];
  return `M${text(a)}L${text(b)}A${round(rb)} ${round(rb)} 0 0 1 ${text(c)}L${text(d)}A${round(ra)} ${round(ra)} 0 0 0 ${text(a)}Z`;
}

/** An arc along the rim from one hour to a later one; `toHour` may lie past 24. */
export function arcPath(radius: number, fromHour: number, toHour: number): string {
  const span = Math.min(toHour - fromHour, 23.999);
  const [a, b] = [pointAt(radius, fromHour), pointAt(radius, fromHour + span)];
  return `M${text(a)}A${round(radius)} ${round(radius)} 0 ${span > 12 ? 1 : 0} 1 ${text(b)}`;
}

function shrunk({ fromHour, toHour, inner, outer }: CellShape): CellShape {
  const [hours, width] = [(toHour - fromHour) / 4, (outer - inner) / 4];
  return { fromHour: fromHour + hours, toHour: toHour - hours, inner: inner + width, outer: outer - width };
}

function text({ x, y }: DialPoint): string {
  return `${round(x)} ${round(y)}`;
}

function round(value: number): number {
  return Math.round(value * 100) / 100;
}
