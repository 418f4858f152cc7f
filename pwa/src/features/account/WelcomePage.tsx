import { useState } from 'react';
import { Button } from '../../design/button/Button';
import { ButtonLink } from '../../design/button/ButtonLink';
import { PageFrame } from '../../design/page/PageFrame';
import { ErrorState } from '../../design/states/ErrorState';
import { paths } from '../../platform/paths';
import { useAccount } from './data/use-account';
import './account.css';

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
    <PageFrame title="Harkmoor">
      <p className="account-who">Log what you hear, and what you do not.</p>
      <p>
        Frequency, time and score in a few taps, with no signal. Back in signal, your club sees on one map
        what can be heard where, at what hour, with which antenna.
      </p>
      <div className="account-acts">
        <Button wide busy={isStarting} onClick={() => void start()}>
          Start a log on this phone
        </Button>
        <ButtonLink to={paths.signIn()} look="outline" wide>
          Sign in
        </ButtonLink>
        <ButtonLink to={paths.signUp()} look="quiet" wide>
          Make an account
        </ButtonLink>
      </div>
      <p className="account-line">
        Starting needs no account and no signal. The log stays on this phone until you sign in; then it
        becomes your My log, which nobody else sees.
      </p>
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
