import { useEffect, useMemo } from 'react';
import { useMap, useMapEvents } from 'react-leaflet';
import { useTheme } from '../../../design/theme/theme';
import type { SquareFigures } from '../answers/questions';
import type { Measure } from '../view/coverage-view';
import { useMapCanvas } from '../../../design/map/use-map-canvas';
import { nightAt, paintNight } from './night';
import { paintLand } from '../../../design/map/paint-land';
import { paintMarks, paintSquares, type Marks } from './paint-squares';
import { readPalette } from '../../../design/map/palette';
import { squareShapes } from './square-shapes';
import { useLand } from '../../../design/map/use-land';

export type MapLayersProps = {
  readonly squares: readonly SquareFigures[];
  readonly measure: Measure;
  /** The moment for which night is drawn; null for none. */
  readonly nightAtMs: number | null;
  readonly marks: Marks;
  readonly zoom: number;
  readonly onZoom: (zoom: number) => void;
  readonly onPoint: (position: { latDeg: number; lonDeg: number }, isPressed: boolean) => void;
};

/** What is painted on the map, from below: land, night, squares, the outlines of chosen ones. */
export function MapLayers({ squares, measure, nightAtMs, marks, zoom, onZoom, onPoint }: MapLayersProps) {
  const map = useMap();
  const theme = useTheme();
  const palette = useMemo(() => readPalette(theme), [theme]);
  const land = useLand(zoom);
  const night = useMemo(() => (nightAtMs === null ? null : nightAt(nightAtMs)), [nightAtMs]);
  const shapes = useMemo(() => squareShapes(squares, measure), [squares, measure]);
  const ground = useMapCanvas('coverage-ground', 210);
  const shade = useMapCanvas('coverage-night', 220);
  const cells = useMapCanvas('coverage-squares', 230);
  const outlines = useMapCanvas('coverage-outlines', 240);

  useEffect(() => {
    ground?.setPaint((context, view) => land && paintLand(context, view, land, palette));
  }, [ground, land, palette]);
  useEffect(() => {
    shade?.setPaint((context, view) => night && paintNight(context, view, night, palette));
  }, [shade, night, palette]);
  useEffect(() => {
    cells?.setPaint((context, view) => paintSquares(context, view, shapes, palette));
  }, [cells, shapes, palette]);
  useEffect(() => {
    outlines?.setPaint((context, view) => paintMarks(context, view, marks, palette));
  }, [outlines, marks, palette]);

  useMapEvents({
    zoomend: () => onZoom(map.getZoom()),
    click: ({ latlng }) => onPoint({ latDeg: latlng.lat, lonDeg: latlng.lng }, true),
    mousemove: ({ latlng }) => onPoint({ latDeg: latlng.lat, lonDeg: latlng.lng }, false),
  });
  return null;
}
