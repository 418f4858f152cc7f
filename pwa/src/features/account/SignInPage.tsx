import { useIonRouter } from '@ionic/react';
import { ButtonLink } from '../../design/button/ButtonLink';
import { useState } from 'react';
import { TextField } from '../../design/form/TextField';
import { PageFrame } from '../../design/page/PageFrame';
import { paths } from '../../platform/paths';
import { useSending } from '../../platform/sending';
import { addressFaults } from './account-faults';
import { signIn } from './data/session';
import { useAccount, useGuestReceptions } from './data/use-account';
import { FormFrame } from './FormFrame';
import { useRequest } from './use-request';

/** Signs in on this phone. What was logged here without an account goes into the person's My log. */
export function SignInPage() {
  const view = useAccount();
  const router = useIonRouter();
  const { sendNow } = useSending();
  const request = useRequest();
  const guestReceptions = useGuestReceptions();
  const [email, setEmail] = useState('');
  const [password, setPassword] = useState('');

  async function submit(): Promise<void> {
    if (view.kind === 'opening' || view.kind === 'failed') return;
    const missing = password === '' ? [{ field: 'password', message: 'Write your password' }] : [];
    const done = await request.ask([...addressFaults(email), ...missing], () =>
      signIn({ email: email.trim(), password }, view.actions),
    );
    if (!done) return;
    if (done.body.takenOver > 0) sendNow();
    router.push(paths.field(), 'root', 'replace');
  }

  return (
    <PageFrame title="Sign in" back={{ to: paths.account(), label: 'Account' }}>
      {guestReceptions > 0 ? (
        <p>
          {guestReceptions === 1 ? 'One reception was' : `${guestReceptions} receptions were`} logged on this
          phone without an account. Signing in takes the log into your My log, where nobody else sees it.
        </p>
      ) : null}
      <FormFrame request={request} submitLabel="Sign in" onSubmit={submit}>
        <TextField
          {...request.errors.field('email')}
          label="Mail address"
          type="email"
          autoComplete="username"
          inputMode="email"
          autoCapitalize="none"
          required
          value={email}
          onChange={setEmail}
        />
        <TextField
          {...request.errors.field('password')}
          label="Password"
          type="password"
          autoComplete="current-password"
          required
          value={password}
          onChange={setPassword}
        />
      </FormFrame>
      <div className="account-acts">
        <ButtonLink to={paths.resetPassword()} look="quiet">
          Forgot the password
        </ButtonLink>
        <ButtonLink to={paths.signUp()} look="quiet">
          Make an account
        </ButtonLink>
      </div>
    </PageFrame>
  );
}
