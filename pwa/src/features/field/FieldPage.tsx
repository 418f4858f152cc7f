import { EmptyState } from '../../design/states/EmptyState';
import { PageFrame } from '../../design/page/PageFrame';

/** Field. */
export function FieldPage() {
  return (
    <PageFrame title="Field">
      <EmptyState title="Not here yet" sentence="This screen is being built. Nothing can be entered on it." />
    </PageFrame>
  );
}
