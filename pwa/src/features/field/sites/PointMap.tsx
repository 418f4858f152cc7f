import 'leaflet/dist/leaflet.css';
import { locatorOf } from '@harkmoor/sync-model/radio/locator/locator';
import type { Position } from '@harkmoor/sync-model/radio/position';
import type { Map as LeafletMap } from 'leaflet';
import { useEffect, useMemo, useState } from 'react';
import { MapContainer, useMap, useMapEvents } from 'react-leaflet';
import { Button } from '../../../design/button/Button';
import { paintLand } from '../../../design/map/paint-land';
import { readPalette } from '../../../design/map/palette';
import { useLand } from '../../../design/map/use-land';
import { useMapCanvas } from '../../../design/map/use-map-canvas';
import { useTheme } from '../../../design/theme/theme';
import './sites.css';

/** Where the map opens without a point: all of the North Atlantic's shores. */
const START = { latDeg: 45, lonDeg: 5, zoom: 3 };
const POINT_ZOOM = 11;
/** A finger sets the cross to about this many pixels. */
const FINGER_PX = 10;
/** Metres of one pixel at zoom 0 on the equator of a web map of 256 px: 2π · 6 378 137 / 256. */
const METRES_PER_PX = 156_543.034;

type PointMapProps = {
  readonly point: Position | null;
  readonly onPoint: (point: Position, accuracyM: number) => void;
};

/** Sets a point under a cross: the map is moved, by finger or arrow keys, and the cross stays. No signal needed. */
export function PointMap({ point, onPoint }: PointMapProps) {
  const [map, setMap] = useState<LeafletMap | null>(null);
  const [middle, setMiddle] = useState<Position>(point ?? START);
  const set = (): void => {
    if (map) onPoint(middle, accuracyAt(middle.latDeg, map.getZoom()));
  };
  return (
    <>
      <div className="point-map">
        <MapContainer
          center={[middle.latDeg, middle.lonDeg]}
          zoom={point ? POINT_ZOOM : START.zoom}
          minZoom={1}
          maxZoom={15}
          worldCopyJump
          zoomControl={false}
          attributionControl={false}
          zoomAnimation={false}
          fadeAnimation={false}
          className="point-map-ground"
          ref={setMap}
        >
          <Ground onMiddle={setMiddle} />
        </MapContainer>
        <div className="point-map-cross" aria-hidden="true">
          <svg width="40" height="40" viewBox="0 0 40 40">
            <path d="M20 2v14M20 24v14M2 20h14M24 20h14" stroke="currentColor" strokeWidth="2.5" />
          </svg>
        </div>
      </div>
      <p className="small num" role="status">
        Under the cross: {middle.latDeg.toFixed(4)}, {middle.lonDeg.toFixed(4)}, locator{' '}
        {locatorOf(middle, 6)}. Outlines: Natural Earth, public domain.
      </p>
      <div className="site-ways">
        <Button look="outline" aria-label="Zoom in" onClick={() => map?.zoomIn()}>
          +
        </Button>
        <Button look="outline" aria-label="Zoom out" onClick={() => map?.zoomOut()}>
          −
        </Button>
        <Button onClick={set}>Set the point here</Button>
      </div>
    </>
  );
}

function Ground({ onMiddle }: { readonly onMiddle: (middle: Position) => void }) {
  const map = useMap();
  const theme = useTheme();
  const palette = useMemo(() => readPalette(theme), [theme]);
  const [zoom, setZoom] = useState(() => map.getZoom());
  const land = useLand(zoom);
  const ground = useMapCanvas('site-ground', 210);
  useEffect(() => {
    ground?.setPaint((context, view) => land && paintLand(context, view, land, palette));
  }, [ground, land, palette]);
  // inside a page that is still coming in, the map has no size yet
  useEffect(() => {
    const watch = new ResizeObserver(() => map.invalidateSize());
    watch.observe(map.getContainer());
    return () => watch.disconnect();
  }, [map]);
  useMapEvents({
    zoomend: () => setZoom(map.getZoom()),
    move: () => {
      const { lat, lng } = map.getCenter().wrap();
      onMiddle({ latDeg: lat, lonDeg: lng });
    },
  });
  return null;
}

/** How well a finger sets a point at a zoom: metres of a few pixels on the web map's scale. */
function accuracyAt(latDeg: number, zoom: number): number {
  const metresPerPx = (METRES_PER_PX * Math.cos((latDeg * Math.PI) / 180)) / 2 ** zoom;
  return Math.min(100_000, Math.ceil(metresPerPx * FINGER_PX));
}
