import { feature } from 'topojson-client';
import type { GeometryCollection, Topology } from 'topojson-specification';
import type { Position } from 'geojson';
import { LAND_COARSE_URL, LAND_FINE_URL } from '../../platform/map-data';
import { worldX, worldY, type WorldRect } from './mercator';
import { unwrapRing } from './unwrap-ring';

/** From this zoom the coarse outlines look like polygons. */
export const FINE_LAND_ZOOM = 7;

/** A closed outline in the map's own measure: x and y in turn, with the box around them. */
export type LandRing = { readonly points: Float64Array; readonly box: WorldRect };
export type Land = readonly LandRing[];

const kept = new Map<string, Promise<Land>>();

/** The outlines of the land, read once; `fine` ones may not be there yet, and then it throws. */
export function loadLand(detail: 'coarse' | 'fine'): Promise<Land> {
  const url = detail === 'coarse' ? LAND_COARSE_URL : LAND_FINE_URL;
  let land = kept.get(url);
  if (!land) {
    land = readLand(url);
    land.catch(() => kept.delete(url));
    kept.set(url, land);
  }
  return land;
}

async function readLand(url: string): Promise<Land> {
  const response = await fetch(url);
  if (!response.ok) throw new Error(`the outlines of the land were answered with ${response.status}`);
  const topology = (await response.json()) as Topology<{ land: GeometryCollection }>;
  return feature(topology, topology.objects.land)
    .features.flatMap(({ geometry }) =>
      geometry.type === 'MultiPolygon'
        ? geometry.coordinates.flat()
        : geometry.type === 'Polygon'
          ? geometry.coordinates
          : [],
    )
    .map((ring) => landRing(unwrapRing(ring)));
}

/** A ring of longitudes and latitudes in the map's own measure. */
export function landRing(ring: readonly Position[]): LandRing {
  const points = new Float64Array(ring.length * 2);
  let [x0, y0, x1, y1] = [Infinity, Infinity, -Infinity, -Infinity];
  ring.forEach(([lonDeg = 0, latDeg = 0], index) => {
    const [x, y] = [worldX(lonDeg), worldY(latDeg)];
    points[index * 2] = x;
    points[index * 2 + 1] = y;
    x0 = Math.min(x0, x);
    y0 = Math.min(y0, y);
    x1 = Math.max(x1, x);
    y1 = Math.max(y1, y);
  });
  return { points, box: { x0, y0, x1, y1 } };
}
