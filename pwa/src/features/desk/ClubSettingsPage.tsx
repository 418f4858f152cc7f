import { EmptyState } from '../../design/states/EmptyState';
import { PageFrame } from '../../design/page/PageFrame';
import { paths } from '../../platform/paths';

/** Club settings. */
export function ClubSettingsPage() {
  return (
    <PageFrame title="Club settings" back={{ to: paths.desk(), label: 'Desk' }}>
      <EmptyState title="Not here yet" sentence="This screen is being built. Nothing can be entered on it." />
    </PageFrame>
  );
}
