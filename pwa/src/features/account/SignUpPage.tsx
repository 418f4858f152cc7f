import { useState } from 'react';
import { ButtonLink } from '../../design/button/ButtonLink';
import { TextField } from '../../design/form/TextField';
import { PageFrame } from '../../design/page/PageFrame';
import { paths } from '../../platform/paths';
import { addressFaults, nameFaults, passwordFaults } from './account-faults';
import { signUp } from './data/account-mail';
import { FormFrame } from './FormFrame';
import { useRequest } from './use-request';

/** Makes an account. The answer is the same for a known address; its owner is told by mail. */
export function SignUpPage() {
  const request = useRequest();
  const [form, setForm] = useState({ name: '', email: '', password: '' });
  const [isSent, setSent] = useState(false);
  const set = (field: keyof typeof form) => (value: string) => {
    request.errors.mended(field);
    setForm((before) => ({ ...before, [field]: value }));
  };

  async function submit(): Promise<void> {
    const faults = [...nameFaults(form.name), ...addressFaults(form.email), ...passwordFaults(form.password)];
    const told = { ...form, name: form.name.trim().normalize('NFC'), email: form.email.trim() };
    if (await request.ask(faults, () => signUp(told))) setSent(true);
  }

  return (
    <PageFrame title="Make an account" back={{ to: paths.account(), label: 'Account' }}>
      {isSent ? (
        <>
          <p>
            A mail is on its way to <strong>{form.email.trim()}</strong>. Open its link to confirm the
            address. You need not wait for it: sign in now and log; only founding a club and inviting wait for
            the confirmation.
          </p>
          <ButtonLink to={paths.signIn()} wide>
            Sign in
          </ButtonLink>
        </>
      ) : (
        <FormFrame request={request} submitLabel="Make the account" onSubmit={submit}>
          <TextField
            {...request.errors.field('name')}
            label="Name"
            hint="Members of your clubs see it. A call sign or a nickname is fine."
            autoComplete="name"
            required
            maxLength={60}
            value={form.name}
            onChange={set('name')}
          />
          <TextField
            {...request.errors.field('email')}
            label="Mail address"
            hint="Never shown to other members."
            type="email"
            autoComplete="username"
            inputMode="email"
            autoCapitalize="none"
            required
            value={form.email}
            onChange={set('email')}
          />
          <TextField
            {...request.errors.field('password')}
            label="Password"
            hint="At least 10 characters; a few words in a row are good."
            type="password"
            autoComplete="new-password"
            required
            value={form.password}
            onChange={set('password')}
          />
        </FormFrame>
      )}
    </PageFrame>
  );
}
