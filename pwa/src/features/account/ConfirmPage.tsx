import { useState } from 'react';
import { useLocation } from 'react-router-dom';
import { ButtonLink } from '../../design/button/ButtonLink';
import { PageFrame } from '../../design/page/PageFrame';
import { EmptyState } from '../../design/states/EmptyState';
import { paths } from '../../platform/paths';
import { confirmAddress } from './data/account-mail';
import { FormFrame } from './FormFrame';
import { linkToken } from './link-token';
import { useRequest } from './use-request';

/** Where the mail's link leads: a button, so that a mail reader that opens links confirms nothing by itself. */
export function ConfirmPage() {
  const token = linkToken(useLocation().hash);
  const request = useRequest();
  const [isDone, setDone] = useState(false);

  async function submit(): Promise<void> {
    if (await request.ask([], () => confirmAddress(token ?? ''))) setDone(true);
  }

  return (
    <PageFrame title="Confirm your address" back={{ to: paths.account(), label: 'Account' }}>
      {token === null ? (
        <EmptyState
          title="Open the link in your mail"
          sentence="This page confirms an address with the link that was mailed to it. The link works once, for 48 hours."
        />
      ) : isDone ? (
        <>
          <p>The address is confirmed. You may now found a club and invite others.</p>
          <ButtonLink to={paths.field()} wide>
            Go to Field
          </ButtonLink>
        </>
      ) : (
        <FormFrame request={request} submitLabel="Confirm the address" onSubmit={submit}>
          <p>One tap confirms that this address is yours.</p>
        </FormFrame>
      )}
    </PageFrame>
  );
}
