import { centreOf } from '@harkmoor/sync-model/radio/locator/locator';
import type { Map as LeafletMap } from 'leaflet';
import { useCallback, useId, useMemo, useState, type KeyboardEvent } from 'react';
import type { SquareFigures } from '../answers/questions';
import type { Measure } from '../view/coverage-view';
import { MapButtons } from './MapButtons';
import { MapSurface } from './MapSurface';
import { dataBounds } from './data-bounds';
import { fitBounds } from './opening';
import { firstSquare, keyAct, nextSquare } from './square-cursor';
import { charactersAtZoom } from './square-scale';
import { squareAt } from './square-shapes';
import { squareLine } from './square-line';
import './map.css';

type CoverageMapProps = {
  readonly squares: readonly SquareFigures[];
  readonly measure: Measure;
  readonly nightAtMs: number | null;
  /** Locators of all places with data: what the map opens on. */
  readonly places: readonly string[];
  readonly selected: string | null;
  readonly zoom: number;
  readonly onZoom: (zoom: number) => void;
  readonly onChoose: (locator: string) => void;
};

/** The map: a finger or a mouse chooses a square, and so do the arrow keys and Enter. */
export function CoverageMap({ squares, selected, zoom, onChoose, ...rest }: CoverageMapProps) {
  const [map, setMap] = useState<LeafletMap | null>(null);
  const [cursor, setCursor] = useState<string | null>(null);
  const [hovered, setHovered] = useState<SquareFigures | null>(null);
  const hintId = useId();
  const marks = useMemo(() => ({ selected, cursor }), [selected, cursor]);

  const point = useCallback(
    (position: { latDeg: number; lonDeg: number }, isPressed: boolean) => {
      const square = squareAt(squares, position, charactersAtZoom(zoom));
      setHovered(square);
      if (isPressed && square) onChoose(square.locator);
    },
    [squares, zoom, onChoose],
  );
  const moveTo = (locator: string | null): void => {
    setCursor(locator);
    if (map && locator !== null) bringIntoView(map, locator);
  };
  const press = (event: KeyboardEvent): void => {
    if (event.target !== event.currentTarget || event.ctrlKey || event.metaKey || event.altKey) return;
    const act = keyAct(event.key);
    const locators = squares.map(({ locator }) => locator);
    if (act === null || (act === 'open' && cursor === null)) return;
    event.preventDefault();
    if (act === 'in') map?.zoomIn();
    else if (act === 'out') map?.zoomOut();
    else if (act === 'first') moveTo(firstSquare(locators));
    else if (act !== 'open') moveTo(nextSquare(locators, cursor ?? selected, act));
    else if (cursor !== null) onChoose(cursor);
  };
  const told = squares.find(({ locator }) => locator === cursor) ?? null;
  const shown = hovered ?? told;
  return (
    <>
      <div
        className="cov-map"
        role="application"
        tabIndex={0}
        aria-label="Map of coverage"
        aria-describedby={hintId}
        onKeyDown={press}
        onBlur={() => setCursor(null)}
        onPointerLeave={() => setHovered(null)}
      >
        <MapSurface {...rest} squares={squares} marks={marks} zoom={zoom} onReady={setMap} onPoint={point} />
      </div>
      <p id={hintId} className="only-heard">
        Arrow keys move over the squares with data, Enter opens one, plus and minus change the zoom. The same
        figures stand in the table.
      </p>
      <p className="only-heard" role="status">
        {told ? squareLine(told) : ''}
      </p>
      {shown ? (
        <div className="cov-tip num" aria-hidden="true">
          {squareLine(shown)}
        </div>
      ) : null}
      <MapButtons
        onIn={() => map?.zoomIn()}
        onOut={() => map?.zoomOut()}
        onAll={() => map && fitBounds(map, dataBounds(rest.places))}
      />
    </>
  );
}

function bringIntoView(map: LeafletMap, locator: string): void {
  const { latDeg, lonDeg } = centreOf(locator);
  map.panInside([latDeg, lonDeg], {
    animate: false,
    paddingTopLeft: [40, 100],
    paddingBottomRight: [40, 170],
  });
}
