import { EmptyState } from '../../design/states/EmptyState';
import { PageFrame } from '../../design/page/PageFrame';
import { paths } from '../../platform/paths';

/** Reception. */
export function ReceptionPage() {
  return (
    <PageFrame title="Reception" back={{ to: paths.logbook(), label: 'Logbook' }}>
      <EmptyState title="Not here yet" sentence="This screen is being built. Nothing can be entered on it." />
    </PageFrame>
  );
}
