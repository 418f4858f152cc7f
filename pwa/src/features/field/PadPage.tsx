import { EmptyState } from '../../design/states/EmptyState';
import { PageFrame } from '../../design/page/PageFrame';
import { paths } from '../../platform/paths';

/** Score pad. */
export function PadPage() {
  return (
    <PageFrame title="Score pad" back={{ to: paths.field(), label: 'Field' }}>
      <EmptyState title="Not here yet" sentence="This screen is being built. Nothing can be entered on it." />
    </PageFrame>
  );
}
