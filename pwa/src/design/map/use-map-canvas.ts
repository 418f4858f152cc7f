import { useEffect, useState } from 'react';
import { useMap } from 'react-leaflet';
import { addMapCanvas, type MapCanvas } from './map-canvas';

/** A canvas over the map that this component stands in, for as long as it stands; null before it is laid. */
export function useMapCanvas(name: string, zIndex: number): MapCanvas | null {
  const map = useMap();
  const [canvas, setCanvas] = useState<MapCanvas | null>(null);
  useEffect(() => {
    const made = addMapCanvas(map, name, zIndex);
    setCanvas(made);
    return () => made.remove();
  }, [map, name, zIndex]);
  return canvas;
}
