import type { SquareCharacters } from '@harkmoor/sync-model/evidence/squares';
import { useMemo, useState } from 'react';
import { SegmentedControl } from '../../design/choice/SegmentedControl';
import { PageFrame } from '../../design/page/PageFrame';
import { EmptyState } from '../../design/states/EmptyState';
import { DataTable } from '../../design/table/DataTable';
import { Button } from '../../design/button/Button';
import { paths } from '../../platform/paths';
import type { Overview } from './answers/questions';
import { OverviewGate } from './OverviewGate';
import { useAnswer } from './data/use-evidence';
import { laptopCells, squareCells, type FilterSheet } from './filters/filter-cells';
import { FilterBar } from './filters/FilterBar';
import { FilterSheets } from './filters/FilterSheets';
import { squareColumns } from './square-columns';
import { viewQuery, widened, type CoverageView } from './view/coverage-view';
import { filterOf } from './view/evidence-filters';
import { amountWords, scopeWords } from './view/scope-words';
import { useCoverageView, type ChangeView } from './view/use-coverage-view';
import { useWide } from './view/use-wide';

/** The squares of the map as a plain table with all their figures. */
export function CoverageTablePage() {
  const [view, change] = useCoverageView(paths.coverageTable());
  const back = { to: paths.coverage(viewQuery(view)), label: 'Coverage' };
  return (
    <PageFrame title="Coverage as a table" back={back} wide>
      <OverviewGate>
        {(overview) => <SquaresTable view={view} overview={overview} onChange={change} />}
      </OverviewGate>
    </PageFrame>
  );
}

const SIZES = [
  { value: '2', label: 'Fields' },
  { value: '4', label: '4 characters' },
  { value: '6', label: '6 characters' },
] as const;

type SquaresTableProps = {
  readonly view: CoverageView;
  readonly overview: Overview;
  readonly onChange: ChangeView;
};

function SquaresTable({ view, overview, onChange }: SquaresTableProps) {
  const [size, setSize] = useState<'2' | '4' | '6'>('6');
  const [sheet, setSheet] = useState<FilterSheet | null>(null);
  const isWide = useWide();
  const filter = useMemo(() => filterOf(view, overview), [view, overview]);
  const characters = Number(size) as SquareCharacters;
  const state = useAnswer({ kind: 'squares', filter, characters });
  const squares = state.kind === 'ready' ? state.answer.squares : [];
  const scope = scopeWords(view, overview);
  return (
    <>
      <div className="cov-square-bar">
        <FilterBar
          cells={
            isWide
              ? laptopCells(view, overview).filter((cell) => cell.sheet !== 'measure')
              : squareCells(view, overview)
          }
          isOver={false}
          onOpen={setSheet}
        />
      </div>
      <div className="cov-sizes">
        <SegmentedControl label="Size of the squares" options={SIZES} value={size} onChange={setSize} />
      </div>
      <p className="soft small num" role="status">
        {scope} · {amountWords(state.kind === 'ready' ? state.answer.n : 0, squares.length)}
      </p>
      {state.kind === 'ready' && squares.length === 0 ? (
        <EmptyState
          title="Nothing was tried with these filters"
          sentence="Widen them to see the squares again."
          action={<Button onClick={() => onChange(widened(view))}>Show all hours, dates and antennas</Button>}
        />
      ) : (
        <DataTable
          caption={`Squares: ${scope}`}
          columns={squareColumns()}
          rows={squares}
          rowKey={({ locator }) => locator}
          rowTo={({ locator }) => paths.square(locator, viewQuery({ ...view, square: null }))}
          startOrder={{ key: 'n', descending: true }}
        />
      )}
      <FilterSheets
        sheet={sheet}
        view={view}
        overview={overview}
        onChange={onChange}
        onClose={() => setSheet(null)}
      />
    </>
  );
}
