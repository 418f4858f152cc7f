import { centreOf } from '@harkmoor/sync-model/radio/locator/locator';
import { useIonRouter } from '@ionic/react';
import { useCallback, useMemo, useState } from 'react';
import { Button } from '../../design/button/Button';
import { paths } from '../../platform/paths';
import type { SquareFigures } from './answers/questions';
import type { CoverageScreenProps } from './CoverageScreen';
import { useAnswer } from './data/use-evidence';
import { HoursPanel } from './filters/HoursPanel';
import { CoverageMap } from './map/CoverageMap';
import { nightMoment } from './map/night';
import { charactersAtZoom, largestCount } from './map/square-scale';
import { viewQuery, widened, WIDEST_VIEW, type CoverageView } from './view/coverage-view';
import { filterOf } from './view/evidence-filters';
import { middleDayMs } from './view/months';
import { shownMonths } from './view/scope-words';
import { sunParts } from './view/sun-parts';

type MapPlaceProps = CoverageScreenProps & {
  readonly isWide: boolean;
  readonly onOpenHours: () => void;
};

const NO_SQUARES: readonly SquareFigures[] = [];

/** The map with what lies over it: hours and key, what to do where nothing matches, whose outlines they are. */
export function MapPlace({ view, overview, onChange, isWide, onOpenHours }: MapPlaceProps) {
  const router = useIonRouter();
  const [zoom, setZoom] = useState(2);
  const filter = useMemo(() => filterOf(view, overview), [view, overview]);
  const state = useAnswer({ kind: 'squares', filter, characters: charactersAtZoom(zoom) });
  const squares = state.kind === 'ready' ? state.answer.squares : NO_SQUARES;
  const nightAtMs = nightMoment(view, overview);
  const sun = useSun(view, overview);
  const choose = useCallback(
    (locator: string) => {
      if (isWide) onChange({ square: locator });
      else router.push(paths.square(locator, viewQuery({ ...view, square: null })));
    },
    [isWide, onChange, router, view],
  );
  const isEmpty = state.kind === 'ready' && state.isCurrent && state.answer.n === 0;
  const amount = {
    observations: state.kind === 'ready' ? state.answer.n : 0,
    squares: squares.length,
    largestN: largestCount(squares),
  };
  return (
    <div className="cov-map-place">
      <CoverageMap
        squares={squares}
        measure={view.measure}
        nightAtMs={nightAtMs}
        places={overview.locators}
        selected={isWide ? view.square : null}
        zoom={zoom}
        onZoom={setZoom}
        onChoose={choose}
      />
      {isEmpty ? <NothingMatches view={view} onChange={onChange} /> : null}
      <HoursPanel
        view={view}
        overview={overview}
        onChange={onChange}
        onOpenHours={onOpenHours}
        nightAtMs={nightAtMs}
        sun={sun}
        amount={amount}
      />
      <p className="cov-attribution">Outlines: Natural Earth, public domain</p>
    </div>
  );
}

/** Day and night where the data is, on the middle day of the months. */
function useSun(view: CoverageView, overview: CoverageScreenProps['overview']) {
  const dayMs = middleDayMs(shownMonths(view, overview));
  const locator = view.square ?? overview.locators[Math.floor(overview.locators.length / 2)];
  return useMemo(
    () => (dayMs === null || locator === undefined ? [] : sunParts(centreOf(locator), dayMs)),
    [dayMs, locator],
  );
}

function NothingMatches({ view, onChange }: Pick<CoverageScreenProps, 'view' | 'onChange'>) {
  const wider = widened(view);
  const isWidest = JSON.stringify({ ...view, square: null }) === JSON.stringify(wider);
  return (
    <div className="cov-nothing cov-panel" role="status">
      <strong>Nothing was tried with these filters.</strong>
      <Button look="outline" onClick={() => onChange(isWidest ? WIDEST_VIEW : wider)}>
        {isWidest ? 'Show the most tried frequency' : 'Show all hours, dates and antennas'}
      </Button>
    </div>
  );
}
