import { useEffect, useState } from 'react';
import { FINE_LAND_ZOOM, loadLand, type Land } from './land';

/** The outlines for a zoom: the coarse ones at once, the fine ones where they are kept or can be fetched. Null for none. */
export function useLand(zoom: number): Land | null {
  const [coarse, setCoarse] = useState<Land | null>(null);
  const [fine, setFine] = useState<Land | null>(null);
  const wantsFine = zoom >= FINE_LAND_ZOOM;
  useEffect(() => {
    let isWanted = true;
    loadLand('coarse').then(
      (land) => isWanted && setCoarse(land),
      (error: unknown) => console.error('the map has no outlines', error),
    );
    return () => {
      isWanted = false;
    };
  }, []);
  useEffect(() => {
    if (!wantsFine) return;
    let isWanted = true;
    loadLand('fine').then(
      (land) => isWanted && setFine(land),
      // without signal before it was ever fetched: the coarse outlines stay
      () => undefined,
    );
    return () => {
      isWanted = false;
    };
  }, [wantsFine]);
  return wantsFine ? (fine ?? coarse) : coarse;
}
