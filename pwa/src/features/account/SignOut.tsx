import { useIonRouter } from '@ionic/react';
import { useState } from 'react';
import { Button } from '../../design/button/Button';
import { Section } from '../../design/layout/Section';
import { ConfirmSheet } from '../../design/sheet/ConfirmSheet';
import { paths } from '../../platform/paths';
import { signOut } from './data/session';
import type { useAccount } from './data/use-account';
import { useUnsent } from './data/use-unsent';

type Actions = Extract<ReturnType<typeof useAccount>, { kind: 'account' }>['actions'];

/** Signs out, after saying what is only here. */
export function SignOut({ accountId, actions }: { readonly accountId: string; readonly actions: Actions }) {
  const router = useIonRouter();
  const unsent = useUnsent();
  const [isAsking, setAsking] = useState(false);
  const [isBusy, setBusy] = useState(false);
  async function leave(): Promise<void> {
    setBusy(true);
    await signOut(accountId, actions);
    router.push(paths.field(), 'root', 'replace');
  }
  return (
    <Section title="Sign out">
      <Button look="outline" onClick={() => setAsking(true)}>
        Sign out on this phone
      </Button>
      <ConfirmSheet
        isOpen={isAsking}
        title={
          unsent > 0
            ? `${unsent} ${unsent === 1 ? 'record is' : 'records are'} only here`
            : 'Sign out on this phone?'
        }
        confirmLabel={unsent > 0 ? 'Sign out all the same' : 'Sign out'}
        cancelLabel="Stay signed in"
        busy={isBusy}
        onConfirm={() => void leave()}
        onClose={() => setAsking(false)}
      >
        <p>
          {unsent > 0
            ? 'They stay on this phone and are sent when you sign in here again. Nobody else can open them from this application. To be sure of them now, stay signed in until they are sent, or keep them as a file on the page “Sending”.'
            : 'Everything is at the server. What this phone holds opens again when you sign in here.'}
        </p>
      </ConfirmSheet>
    </Section>
  );
}
