import type { Map as LeafletMap } from 'leaflet';
import { useEffect, useRef } from 'react';
import { useMap } from 'react-leaflet';
import { openOn } from './opening';

type MapFitterProps = {
  /** Locators of all places with data. */
  readonly places: readonly string[];
  readonly onReady: (map: LeafletMap) => void;
};

/** Gives the map its size once the page has one, and opens it on the data the first time. */
export function MapFitter({ places, onReady }: MapFitterProps) {
  const map = useMap();
  const isFitted = useRef(false);
  useEffect(() => {
    onReady(map);
  }, [map, onReady]);
  useEffect(() => {
    const measure = (): void => {
      map.invalidateSize({ animate: false, pan: false });
      if (isFitted.current || map.getSize().y === 0) return;
      isFitted.current = true;
      openOn(map, places);
    };
    const observer = new ResizeObserver(measure);
    observer.observe(map.getContainer());
    return () => observer.disconnect();
  }, [map, places]);
  return null;
}
