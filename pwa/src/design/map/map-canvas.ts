import { DomUtil, type Map as LeafletMap } from 'leaflet';
import type { Paint } from './canvas-view';
import { worldSizePx } from './mercator';

/** The share of the view that is painted beyond each edge, so that a pan shows no blank and costs no painting. */
const MARGIN = 0.25;
const RATIO_MAX = 2;

export type MapCanvas = {
  /** Paints at the next frame. */
  repaint(): void;
  setPaint(paint: Paint): void;
  remove(): void;
};

/** Lays a canvas over the map that moves with it; it is painted again when the map leaves what was painted. */
export function addMapCanvas(map: LeafletMap, paneName: string, zIndex: number): MapCanvas {
  const pane = map.getPane(paneName) ?? map.createPane(paneName);
  pane.style.zIndex = String(zIndex);
  pane.style.pointerEvents = 'none';
  const canvas = document.createElement('canvas');
  canvas.setAttribute('aria-hidden', 'true');
  pane.append(canvas);
  let paint: Paint = () => undefined;
  let frame = 0;
  let marginPx = { x: 0, y: 0 };

  const draw = (): void => {
    frame = 0;
    const size = map.getSize();
    const context = canvas.getContext('2d');
    if (!context || size.x === 0 || size.y === 0) return;
    marginPx = { x: Math.ceil(size.x * MARGIN), y: Math.ceil(size.y * MARGIN) };
    const widthPx = size.x + 2 * marginPx.x;
    const heightPx = size.y + 2 * marginPx.y;
    fit(canvas, widthPx, heightPx);
    const corner = map.containerPointToLayerPoint([-marginPx.x, -marginPx.y]);
    DomUtil.setPosition(canvas, corner);
    const origin = map.getPixelOrigin().add(corner);
    const ratio = canvas.width / widthPx;
    context.setTransform(ratio, 0, 0, ratio, 0, 0);
    context.clearRect(0, 0, widthPx, heightPx);
    const zoom = map.getZoom();
    paint(context, {
      zoom,
      worldPx: worldSizePx(zoom),
      originX: origin.x,
      originY: origin.y,
      widthPx,
      heightPx,
    });
  };
  const repaint = (): void => {
    frame ||= requestAnimationFrame(draw);
  };
  const repaintAtEdge = (): void => {
    const at = map.layerPointToContainerPoint(DomUtil.getPosition(canvas));
    if (Math.abs(at.x + marginPx.x) > marginPx.x || Math.abs(at.y + marginPx.y) > marginPx.y) repaint();
  };
  map.on('moveend zoom viewreset resize', repaint);
  map.on('move', repaintAtEdge);
  repaint();
  return {
    repaint,
    setPaint: (next) => {
      paint = next;
      repaint();
    },
    remove: () => {
      cancelAnimationFrame(frame);
      map.off('moveend zoom viewreset resize', repaint);
      map.off('move', repaintAtEdge);
      canvas.remove();
    },
  };
}

function fit(canvas: HTMLCanvasElement, widthPx: number, heightPx: number): void {
  const ratio = Math.min(window.devicePixelRatio || 1, RATIO_MAX);
  const [width, height] = [Math.round(widthPx * ratio), Math.round(heightPx * ratio)];
  if (canvas.width === width && canvas.height === height) return;
  canvas.width = width;
  canvas.height = height;
  canvas.style.width = `${widthPx}px`;
  canvas.style.height = `${heightPx}px`;
}
