import { useIonRouter } from '@ionic/react';
import { useState } from 'react';
import { ButtonLink } from '../../design/button/ButtonLink';
import type { FieldFault } from '../../design/form/use-form-errors';
import { SelectField } from '../../design/form/SelectField';
import { TextField } from '../../design/form/TextField';
import { Section } from '../../design/layout/Section';
import { PageFrame } from '../../design/page/PageFrame';
import { EmptyState } from '../../design/states/EmptyState';
import { paths } from '../../platform/paths';
import { useSending } from '../../platform/sending';
import { nameFaults } from './account-faults';
import { foundClub, joinClub } from './data/clubs';
import { useAccount } from './data/use-account';
import { FormFrame } from './FormFrame';
import { useRequest } from './use-request';

const REGIONS = [
  { value: '1', label: 'Region 1: Europe, Africa, northern Asia' },
  { value: '2', label: 'Region 2: the Americas' },
  { value: '3', label: 'Region 3: southern Asia, Oceania' },
] as const;

/** Joins a club by its code, or founds one. */
export function ClubsPage() {
  const view = useAccount();
  return (
    <PageFrame title="Found or join a club" back={{ to: paths.account(), label: 'Account' }}>
      {view.kind === 'account' ? (
        <>
          <JoinForm />
          <FoundForm />
        </>
      ) : (
        <EmptyState
          title="A club needs an account"
          sentence="What you log now stays on this phone and is taken along when you sign in."
          action={<ButtonLink to={paths.signIn()}>Sign in</ButtonLink>}
        />
      )}
    </PageFrame>
  );
}

function useEntered() {
  const router = useIonRouter();
  const { sendNow } = useSending();
  return () => {
    sendNow();
    router.push(paths.account(), 'back', 'pop');
  };
}

function JoinForm() {
  const view = useAccount();
  const request = useRequest();
  const entered = useEntered();
  const [code, setCode] = useState('');
  async function submit(): Promise<void> {
    if (view.kind !== 'account') return;
    const plain = code.replace(/[\s-]/g, '').toUpperCase();
    if (await request.ask(codeFaults(plain), () => joinClub(plain, view.log, view.actions))) entered();
  }
  return (
    <Section title="Join by code">
      <FormFrame request={request} submitLabel="Join" onSubmit={submit}>
        <TextField
          {...request.errors.field('code')}
          label="Code"
          hint="10 letters and figures, from an admin of the club"
          autoCapitalize="characters"
          figures
          required
          value={code}
          onChange={setCode}
        />
      </FormFrame>
    </Section>
  );
}

function codeFaults(plain: string): FieldFault[] {
  if (/^[0-9A-Z]{10}$/.test(plain)) return [];
  const message =
    plain === '' ? 'Write the code that an admin gave you' : 'A code has 10 letters and figures';
  return [{ field: 'code', message }];
}

function FoundForm() {
  const view = useAccount();
  const request = useRequest();
  const entered = useEntered();
  const [name, setName] = useState('');
  const [region, setRegion] = useState<'1' | '2' | '3'>('1');
  async function submit(): Promise<void> {
    if (view.kind !== 'account') return;
    const form = { name: name.trim().normalize('NFC'), ituRegion: Number(region) as 1 | 2 | 3 };
    if (await request.ask(nameFaults(name), () => foundClub(form, view.log, view.actions))) entered();
  }
  return (
    <Section title="Found a club">
      <FormFrame request={request} submitLabel="Found the club" onSubmit={submit}>
        <TextField
          {...request.errors.field('name')}
          label="Name of the club"
          required
          maxLength={60}
          value={name}
          onChange={setName}
        />
        <SelectField
          {...request.errors.field('ituRegion')}
          label="ITU region"
          hint="Decides bands and channel rasters"
          required
          options={REGIONS}
          value={region}
          onChange={setRegion}
        />
      </FormFrame>
    </Section>
  );
}
