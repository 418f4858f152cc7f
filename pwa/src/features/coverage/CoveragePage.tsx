import { PageFrame } from '../../design/page/PageFrame';
import { paths } from '../../platform/paths';
import { CoverageScreen } from './CoverageScreen';
import { OverviewGate } from './OverviewGate';
import { useCoverageView } from './view/use-coverage-view';

/** What can be heard where: squares on a map, from all receptions on this device. Needs no network. */
export function CoveragePage() {
  const [view, change] = useCoverageView(paths.coverage());
  return (
    <PageFrame title="Coverage" hideTitle scrolls={false} wide>
      <OverviewGate>
        {(overview) => <CoverageScreen view={view} overview={overview} onChange={change} />}
      </OverviewGate>
    </PageFrame>
  );
}
