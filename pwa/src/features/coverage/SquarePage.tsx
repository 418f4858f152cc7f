import { normaliseLocator } from '@harkmoor/sync-model/radio/locator/locator';
import { useState } from 'react';
import { useParams } from 'react-router-dom';
import { ButtonLink } from '../../design/button/ButtonLink';
import { PageFrame } from '../../design/page/PageFrame';
import { EmptyState } from '../../design/states/EmptyState';
import { paths } from '../../platform/paths';
import { OverviewGate } from './OverviewGate';
import { SquareEvidence } from './evidence/SquareEvidence';
import { squareCells, type FilterSheet } from './filters/filter-cells';
import { FilterBar } from './filters/FilterBar';
import { FilterSheets } from './filters/FilterSheets';
import { viewQuery } from './view/coverage-view';
import { scopeWords } from './view/scope-words';
import { useCoverageView } from './view/use-coverage-view';

/** The evidence of one square, named by its locator in the address. */
export function SquarePage() {
  const { locator: named = '' } = useParams();
  const locator = normaliseLocator(named);
  const [fromAddress, change] = useCoverageView(paths.square(named));
  const [sheet, setSheet] = useState<FilterSheet | null>(null);
  const back = {
    to: paths.coverage(viewQuery({ ...fromAddress, square: locator ?? null })),
    label: 'Coverage',
  };
  if (locator === undefined || locator.length > 6) {
    return (
      <PageFrame title="Square" back={back}>
        <EmptyState
          title="This is no square of the map"
          sentence={`“${named}” is not a locator of two, four or six characters, like JO46ac.`}
          action={<ButtonLink to={paths.coverage()}>Open the map</ButtonLink>}
        />
      </PageFrame>
    );
  }
  const view = { ...fromAddress, square: locator };
  return (
    <PageFrame title={`Square ${locator}`} back={back}>
      <OverviewGate>
        {(overview) => (
          <>
            <p className="soft small num">{scopeWords(view, overview)}</p>
            <div className="cov-square-bar">
              <FilterBar cells={squareCells(view, overview)} isOver={false} onOpen={setSheet} />
            </div>
            <SquareEvidence view={view} overview={overview} onChange={changeHere} hideHead />
            <FilterSheets
              sheet={sheet}
              view={view}
              overview={overview}
              onChange={changeHere}
              onClose={() => setSheet(null)}
            />
          </>
        )}
      </OverviewGate>
    </PageFrame>
  );

  /** The square stands in the path, not in the query. */
  function changeHere(changed: Parameters<typeof change>[0]): void {
    change({ ...changed, square: null });
  }
}
