/** A point on WGS84: latitude −90 to 90, longitude −180 to 180, east and north positive, in degrees. */
export type Position = { latDeg: number; lonDeg: number };

/** The same longitude between −180 (kept) and 180 (becomes −180), in degrees. */
export function wrapLonDeg(lonDeg: number): number {
  return ((((lonDeg + 180) % 360) + 360) % 360) - 180;
}

/** The same direction from 0 up to, but not including, 360 degrees. */
export function wrapBearingDeg(bearingDeg: number): number {
  return ((bearingDeg % 360) + 360) % 360;
}

/** Throws where the position is none: callers check what people and networks send before they compute. */
export function assertPosition({ latDeg, lonDeg }: Position): void {
  const valid = Math.abs(latDeg) <= 90 && Number.isFinite(lonDeg);
  if (!valid) throw new Error(`No position on Earth: latitude ${latDeg}, longitude ${lonDeg}.`);
}
