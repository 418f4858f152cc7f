import { EmptyState } from '../../design/states/EmptyState';
import { PageFrame } from '../../design/page/PageFrame';
import { paths } from '../../platform/paths';

/** Target list. */
export function TargetListPage() {
  return (
    <PageFrame title="Target list" back={{ to: paths.targetLists(), label: 'Target lists' }}>
      <EmptyState title="Not here yet" sentence="This screen is being built. Nothing can be entered on it." />
    </PageFrame>
  );
}
