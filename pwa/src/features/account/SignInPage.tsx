import { EmptyState } from '../../design/states/EmptyState';
import { PageFrame } from '../../design/page/PageFrame';
import { paths } from '../../platform/paths';

/** Sign in. */
export function SignInPage() {
  return (
    <PageFrame title="Sign in" back={{ to: paths.account(), label: 'Account' }}>
      <EmptyState title="Not here yet" sentence="This screen is being built. Nothing can be entered on it." />
    </PageFrame>
  );
}
