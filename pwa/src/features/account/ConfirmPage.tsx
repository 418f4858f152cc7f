import { EmptyState } from '../../design/states/EmptyState';
import { PageFrame } from '../../design/page/PageFrame';
import { paths } from '../../platform/paths';

/** Confirm address. */
export function ConfirmPage() {
  return (
    <PageFrame title="Confirm address" back={{ to: paths.account(), label: 'Account' }}>
      <EmptyState title="Not here yet" sentence="This screen is being built. Nothing can be entered on it." />
    </PageFrame>
  );
}
