import { useEffect, useState } from 'react';
import { FINE_LAND_ZOOM, loadLand, type Land } from './land';

export type LandState = { readonly land: Land | null; readonly isMissing: boolean };

/** The outlines for a zoom: the coarse ones at once, the fine ones where they are kept or can be fetched. */
export function useLand(zoom: number): LandState {
  const [coarse, setCoarse] = useState<Land | null>(null);
  const [fine, setFine] = useState<Land | null>(null);
  const [isMissing, setMissing] = useState(false);
  const wantsFine = zoom >= FINE_LAND_ZOOM;
  useEffect(() => {
    let isWanted = true;
    loadLand('coarse').then(
      (land) => isWanted && setCoarse(land),
      () => isWanted && setMissing(true),
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
  return { land: wantsFine ? (fine ?? coarse) : coarse, isMissing };
}
