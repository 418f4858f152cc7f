import { useState } from 'react';
import { Button } from '../../design/button/Button';
import { ButtonLink } from '../../design/button/ButtonLink';
import { Mark } from '../../design/mark/Mark';
import { PageFrame } from '../../design/page/PageFrame';
import { ErrorState } from '../../design/states/ErrorState';
import { paths } from '../../platform/paths';
import { useAccount } from './data/use-account';
import './account.css';
import './welcome.css';

/** The very first opening: start a log here and now, without account and signal, or sign in. */
export function WelcomePage() {
  const view = useAccount();
  const [isStarting, setStarting] = useState(false);
  if (view.kind === 'failed') return <DidNotOpen error={view.error} />;
  async function start(): Promise<void> {
    if (view.kind !== 'none') return;
    setStarting(true);
    await view.actions.startGuestLog();
  }
  return (
    <PageFrame title="Harkmoor" hideTitle>
      <div className="welcome">
        <div className="welcome-name" aria-hidden="true">
          <Mark />
          Harkmoor
        </div>
        <p className="welcome-lead">Log what you hear, and what you do not.</p>
        <p className="account-line">
          Frequency, time and score in a few taps, with no signal. Back in signal, your club sees on one map
          what can be heard where, at what hour, with which antenna.
        </p>
        <div className="welcome-acts">
          <Button wide busy={isStarting} onClick={() => void start()}>
            Start a log on this phone
          </Button>
          <p className="account-line small">
            Needs no account and no signal. It stays on this phone until you sign in; then it becomes your My
            log, which nobody else sees.
          </p>
          <div className="welcome-pair">
            <ButtonLink to={paths.signIn()} look="outline">
              Sign in
            </ButtonLink>
            <ButtonLink to={paths.signUp()} look="outline">
              Make an account
            </ButtonLink>
          </div>
        </div>
      </div>
    </PageFrame>
  );
}

function DidNotOpen({ error }: { readonly error: unknown }) {
  return (
    <PageFrame title="The log did not open">
      <ErrorState
        title="The log on this phone did not open"
        sentence="Close other windows of this application and open it again. Nothing was removed."
        detail={error instanceof Error ? error.message : undefined}
        action={<Button onClick={() => location.reload()}>Open again</Button>}
      />
    </PageFrame>
  );
}
