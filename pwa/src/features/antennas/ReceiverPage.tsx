import { EmptyState } from '../../design/states/EmptyState';
import { PageFrame } from '../../design/page/PageFrame';
import { paths } from '../../platform/paths';

/** Receiver. */
export function ReceiverPage() {
  return (
    <PageFrame title="Receiver" back={{ to: paths.antennas(), label: 'Antennas' }}>
      <EmptyState title="Not here yet" sentence="This screen is being built. Nothing can be entered on it." />
    </PageFrame>
  );
}
