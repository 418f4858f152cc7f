import 'leaflet/dist/leaflet.css';
import type { Map as LeafletMap } from 'leaflet';
import { MapContainer } from 'react-leaflet';
import { MapFitter } from './MapFitter';
import { MapLayers, type MapLayersProps } from './MapLayers';

type MapSurfaceProps = MapLayersProps & {
  readonly places: readonly string[];
  readonly onReady: (map: LeafletMap) => void;
};

/** The map itself, without any control of the library's own: panning, zooming and what is painted. */
export function MapSurface({ places, onReady, ...layers }: MapSurfaceProps) {
  return (
    <MapContainer
      center={[30, 10]}
      zoom={2}
      minZoom={1}
      maxZoom={12}
      worldCopyJump
      zoomControl={false}
      attributionControl={false}
      zoomAnimation={false}
      fadeAnimation={false}
      keyboard={false}
      className="cov-leaflet"
    >
      <MapFitter places={places} onReady={onReady} />
      <MapLayers {...layers} />
    </MapContainer>
  );
}
