import { EmptyState } from '../../design/states/EmptyState';
import { PageFrame } from '../../design/page/PageFrame';
import { paths } from '../../platform/paths';

/** Coverage as a table. */
export function CoverageTablePage() {
  return (
    <PageFrame title="Coverage as a table" back={{ to: paths.coverage(), label: 'Coverage' }}>
      <EmptyState title="Not here yet" sentence="This screen is being built. Nothing can be entered on it." />
    </PageFrame>
  );
}
