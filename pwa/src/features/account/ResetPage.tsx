import { EmptyState } from '../../design/states/EmptyState';
import { PageFrame } from '../../design/page/PageFrame';
import { paths } from '../../platform/paths';

/** New password. */
export function ResetPage() {
  return (
    <PageFrame title="New password" back={{ to: paths.signIn(), label: 'Sign in' }}>
      <EmptyState title="Not here yet" sentence="This screen is being built. Nothing can be entered on it." />
    </PageFrame>
  );
}
