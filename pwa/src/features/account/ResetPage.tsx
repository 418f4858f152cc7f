import { useState } from 'react';
import { useLocation } from 'react-router-dom';
import { ButtonLink } from '../../design/button/ButtonLink';
import { TextField } from '../../design/form/TextField';
import { PageFrame } from '../../design/page/PageFrame';
import { paths } from '../../platform/paths';
import { addressFaults, passwordFaults } from './account-faults';
import { askForReset, resetPassword } from './data/account-mail';
import { FormFrame } from './FormFrame';
import { linkToken } from './link-token';
import { useRequest } from './use-request';

/** Asks for a mail with a link, or, opened by that link, takes the new password. */
export function ResetPage() {
  const token = linkToken(useLocation().hash);
  return (
    <PageFrame title="New password" back={{ to: paths.signIn(), label: 'Sign in' }}>
      {token === null ? <AskForLink /> : <NewPassword token={token} />}
    </PageFrame>
  );
}

function AskForLink() {
  const request = useRequest();
  const [email, setEmail] = useState('');
  const [isSent, setSent] = useState(false);
  async function submit(): Promise<void> {
    if (await request.ask(addressFaults(email), () => askForReset(email.trim()))) setSent(true);
  }
  if (isSent) {
    return (
      <p>
        If an account has the address <strong>{email.trim()}</strong>, a mail with a link is on its way. It
        works once, for 30 minutes.
      </p>
    );
  }
  return (
    <FormFrame request={request} submitLabel="Send the link" onSubmit={submit}>
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
    </FormFrame>
  );
}

function NewPassword({ token }: { readonly token: string }) {
  const request = useRequest();
  const [password, setPassword] = useState('');
  const [isDone, setDone] = useState(false);
  async function submit(): Promise<void> {
    if (await request.ask(passwordFaults(password), () => resetPassword({ token, password }))) setDone(true);
  }
  if (isDone) {
    return (
      <>
        <p>
          The password is changed, and every session has ended. What is on your phones stays there and is sent
          once you sign in.
        </p>
        <ButtonLink to={paths.signIn()} wide>
          Sign in
        </ButtonLink>
      </>
    );
  }
  return (
    <FormFrame request={request} submitLabel="Change the password" onSubmit={submit}>
      <TextField
        {...request.errors.field('password')}
        label="New password"
        hint="At least 10 characters; a few words in a row are good."
        type="password"
        autoComplete="new-password"
        required
        value={password}
        onChange={setPassword}
      />
    </FormFrame>
  );
}
