import { Link } from 'react-router-dom';
import { ButtonLink } from '../../design/button/ButtonLink';
import { RowLink } from '../../design/layout/RowLink';
import { Section } from '../../design/layout/Section';
import { PageFrame } from '../../design/page/PageFrame';
import { ErrorState } from '../../design/states/ErrorState';
import { paths } from '../../platform/paths';
import { ClubSwitch } from './ClubSwitch';
import { useAccount } from './data/use-account';
import { SignOut } from './SignOut';
import './account.css';

/** Who uses this phone, which club is shown, and the ways to the sending, the settings and the desk. */
export function AccountPage() {
  const view = useAccount();
  return (
    <PageFrame title="Account" back={{ to: paths.field(), label: 'Field' }}>
      {view.kind === 'failed' ? (
        <ErrorState
          title="The log on this phone did not open"
          sentence="Close other tabs of this application and open it again. Nothing was removed."
          detail={view.error instanceof Error ? view.error.message : undefined}
        />
      ) : null}
      {view.kind === 'account' ? (
        <>
          <p>
            <span className="account-who">{view.account.name}</span>
            <br />
            <span className="account-line">
              {view.account.email}
              {view.account.confirmed ? '' : ' · not confirmed yet: open the link in the mail'}
            </span>
          </p>
          <ClubSwitch />
        </>
      ) : null}
      {view.kind === 'guest' || view.kind === 'none' ? (
        <WithoutAccount hasLog={view.kind === 'guest'} />
      ) : null}
      <Section title="This phone">
        <RowLink to={paths.sync()} name="Sending" note="What waits, why, and as a file" />
        <RowLink to={paths.settings()} name="Settings" note="Theme, left hand, storage" />
        <RowLink to={paths.targetLists()} name="Target lists" note="What to listen for" />
        <RowLink to={paths.people()} name="People" note="Members of the club and their roles" />
      </Section>
      {view.kind === 'account' ? <SignOut accountId={view.account.id} actions={view.actions} /> : null}
    </PageFrame>
  );
}

function WithoutAccount({ hasLog }: { readonly hasLog: boolean }) {
  return (
    <>
      <p>
        {hasLog
          ? 'This log is on this phone only. With an account it is sent when there is signal, and a club’s map opens.'
          : 'No log is open on this phone.'}
      </p>
      <div className="account-acts">
        <ButtonLink to={paths.signIn()} wide>
          Sign in
        </ButtonLink>
        <ButtonLink to={paths.signUp()} look="outline" wide>
          Make an account
        </ButtonLink>
      </div>
      {hasLog ? null : (
        <p>
          Or <Link to={paths.field()}>start a log on this phone</Link>, without an account and without signal.
        </p>
      )}
    </>
  );
}
