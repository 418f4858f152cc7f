import { PageFrame } from '../../design/page/PageFrame';
import { paths } from '../../platform/paths';

/** The look and the habits of this phone. */
export function SettingsPage() {
  return (
    <PageFrame title="Settings" back={{ to: paths.account(), label: 'Account' }}>
      <p>The look of the application is chosen here.</p>
    </PageFrame>
  );
}
