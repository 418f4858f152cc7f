/** A point of the web's map square: x from 0 at 180° W to 1 at 180° E, y from 0 in the north to 1 in the south. */
export type WorldPoint = { readonly x: number; readonly y: number };
export type WorldRect = {
  readonly x0: number;
  readonly y0: number;
  readonly x1: number;
  readonly y1: number;
};

/** The latitude at which the square map ends: atan(sinh π). */
export const MAP_LAT_MAX_DEG = 85.051_128_779_806_59;
/** Pixels of the whole world at zoom 0. */
const WORLD_PX = 256;
const RAD = Math.PI / 180;

export function worldX(lonDeg: number): number {
  return (lonDeg + 180) / 360;
}

/** Spherical Mercator (EPSG:3857) as a share of the map's height; latitudes beyond the map stand at its edge. */
export function worldY(latDeg: number): number {
  const lat = Math.max(-MAP_LAT_MAX_DEG, Math.min(MAP_LAT_MAX_DEG, latDeg)) * RAD;
  return 0.5 - Math.log(Math.tan(Math.PI / 4 + lat / 2)) / (2 * Math.PI);
}

/** Pixels from one edge of the world to the other at a zoom, fractions too. */
export function worldSizePx(zoom: number): number {
  return WORLD_PX * 2 ** zoom;
}
