import { useCallback, useState } from 'react';
import type { Overview } from './answers/questions';
import { SquareEvidence } from './evidence/SquareEvidence';
import { laptopCells, phoneCells, type FilterSheet } from './filters/filter-cells';
import { FilterBar } from './filters/FilterBar';
import { FilterSheets } from './filters/FilterSheets';
import { MapPlace } from './MapPlace';
import type { CoverageView } from './view/coverage-view';
import type { ChangeView } from './view/use-coverage-view';
import { useWide } from './view/use-wide';

export type CoverageScreenProps = {
  readonly view: CoverageView;
  readonly overview: Overview;
  readonly onChange: ChangeView;
};

/** The map with its filters, and on a laptop the evidence of the chosen square beside it. */
export function CoverageScreen({ view, overview, onChange }: CoverageScreenProps) {
  const isWide = useWide();
  const [sheet, setSheet] = useState<FilterSheet | null>(null);
  const openHours = useCallback(() => setSheet('hours'), []);
  return (
    <div className="cov-screen">
      <h2 className="only-heard">Map</h2>
      <div className="cov-pane-map">
        <FilterBar
          cells={isWide ? laptopCells(view, overview) : phoneCells(view, overview)}
          isOver={!isWide}
          onOpen={setSheet}
        />
        <MapPlace
          view={view}
          overview={overview}
          onChange={onChange}
          onOpenHours={openHours}
          isWide={isWide}
        />
      </div>
      {isWide ? (
        <aside className="cov-pane-evidence" aria-label="Evidence">
          <SquareEvidence view={view} overview={overview} onChange={onChange} />
        </aside>
      ) : null}
      <FilterSheets
        sheet={sheet}
        view={view}
        overview={overview}
        onChange={onChange}
        onClose={() => setSheet(null)}
      />
    </div>
  );
}
