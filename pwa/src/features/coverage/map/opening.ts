import { centreOf, coarser, type LocatorSquare } from '@harkmoor/sync-model/radio/locator/locator';
import type { Map as LeafletMap } from 'leaflet';
import { dataBounds, densestPlace } from './data-bounds';
import { charactersAtZoom } from './square-scale';

/** No closer than this, or the land around a single square is nowhere to be seen. */
const FIT_ZOOM_MAX = 9;
/** Fewer squares than this tell nothing: the map opens closer, where they are finer. */
const SQUARES_MIN = 4;
const FINER_FROM: Readonly<Record<2 | 4, number>> = { 2: 6, 4: 9 };

/** Opens on the squares with data: all of them, or closer on the densest where all would be two or three large ones. */
export function openOn(map: LeafletMap, places: readonly string[]): void {
  fitBounds(map, dataBounds(places));
  for (;;) {
    const characters = charactersAtZoom(map.getZoom());
    const densest = densestPlace(places);
    if (characters === 6 || densest === null) return;
    const drawn = new Set(places.map((place) => coarser(place, characters))).size;
    if (drawn >= SQUARES_MIN || places.length <= drawn) return;
    const { latDeg, lonDeg } = centreOf(densest);
    map.setView([latDeg, lonDeg], FINER_FROM[characters], { animate: false });
  }
}

/** Shows a box whole, clear of the panels that lie over the map; the world where there is none. */
export function fitBounds(map: LeafletMap, bounds: LocatorSquare | null): void {
  if (!bounds) {
    map.setView([30, 10], 2, { animate: false });
    return;
  }
  const { southDeg, westDeg, northDeg, eastDeg } = bounds;
  const isNarrow = map.getSize().x < 700;
  map.fitBounds(
    [
      [southDeg, westDeg],
      [northDeg, eastDeg],
    ],
    {
      animate: false,
      maxZoom: FIT_ZOOM_MAX,
      paddingTopLeft: [12, isNarrow ? 72 : 16],
      paddingBottomRight: [12, isNarrow ? 190 : 160],
    },
  );
}
