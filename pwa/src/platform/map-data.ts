import coarseUrl from 'world-atlas/land-50m.json?url';
import fineUrl from 'world-atlas/land-10m.json?url';

/** The land at 1:50 m: part of what is installed, always there without signal. */
export const LAND_COARSE_URL: string = coarseUrl;
/** The land at 1:10 m: fetched after installation and kept; for zoom 7 and closer. */
export const LAND_FINE_URL: string = fineUrl;

/** The cache of the fine map; outlives updates of the application as long as the map is the same. */
export const MAP_CACHE = 'harkmoor-map';

/** True once the fine map lies on this device. */
export async function isFineMapKept(): Promise<boolean> {
  if (!('caches' in window)) return false;
  return (await (await caches.open(MAP_CACHE)).match(LAND_FINE_URL)) !== undefined;
}

/** Fetches the fine map once and keeps it; throws away older ones. Without signal it stays for the next opening. */
export async function keepFineMap(): Promise<boolean> {
  if (!('caches' in window)) return false;
  const cache = await caches.open(MAP_CACHE);
  if (await cache.match(LAND_FINE_URL)) return true;
  const response = await fetch(LAND_FINE_URL).catch(() => null);
  if (!response?.ok) return false;
  await cache.put(LAND_FINE_URL, response);
  for (const request of await cache.keys()) {
    if (new URL(request.url).pathname !== new URL(LAND_FINE_URL, location.href).pathname)
      await cache.delete(request);
  }
  return true;
}
