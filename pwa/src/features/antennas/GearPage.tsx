import { EmptyState } from '../../design/states/EmptyState';
import { PageFrame } from '../../design/page/PageFrame';

/** Antennas. */
export function GearPage() {
  return (
    <PageFrame title="Antennas">
      <EmptyState title="Not here yet" sentence="This screen is being built. Nothing can be entered on it." />
    </PageFrame>
  );
}
