import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { Button } from '../../design/button/Button';
import { ButtonLink } from '../../design/button/ButtonLink';
import { Section } from '../../design/layout/Section';
import { PageFrame } from '../../design/page/PageFrame';
import { EmptyState } from '../../design/states/EmptyState';
import { paths } from '../../platform/paths';
import { useSending } from '../../platform/sending';
import { utcDateTime } from '../../platform/utc-text';
import { useSendingState, useWaitingRecords, type SendingState } from './data/use-sending-state';
import { lampOf, pauseWords } from './lamp-words';
import { lampInput } from './SyncLamp';
import { UnsentFile } from './UnsentFile';
import { waitingName, waitingReason } from './waiting-words';
import './sync-status.css';

/** The longest list that is drawn at once; beyond it the count says how many more there are. */
const SHOWN_MAX = 100;

/** What waits, since when and why; a way to send now, and to keep what is only here as a file. */
export function SyncPage() {
  const state = useSendingState();
  return (
    <PageFrame title="Sending" back={{ to: paths.field(), label: 'Field' }}>
      {state.kind === 'no-log' ? (
        <EmptyState
          title="No log on this phone"
          sentence="Once there is one, this page shows what waits to be sent."
          action={<ButtonLink to={paths.field()}>Go to Field</ButtonLink>}
        />
      ) : (
        <>
          <Standing state={state} />
          <Waiting />
          <UnsentFile log={state.log} />
        </>
      )}
    </PageFrame>
  );
}

function Standing({ state }: { readonly state: Exclude<SendingState, { kind: 'no-log' }> }) {
  const { sendNow } = useSending();
  if (state.kind === 'guest') {
    return (
      <Section title="On this phone only">
        <p>
          This log has no account, so nobody else has a copy. Sign in when you have signal, and it is taken
          into your My log and sent.
        </p>
        <ButtonLink to={paths.signIn()}>Sign in</ButtonLink>
      </Section>
    );
  }
  const { status, completeAt } = state;
  return (
    <Section title={lampOf(lampInput(state), Date.now()).text}>
      {status.pause ? <p>{pauseWords(status.pause)}</p> : null}
      <p className="waiting-why num">
        {completeAt === null
          ? 'There was no complete round yet.'
          : `Everything was at the server at ${utcDateTime(completeAt)}.`}
      </p>
      <div className="waiting-acts">
        {status.pause === 'signed-out' ? (
          <ButtonLink to={paths.signIn()}>Sign in</ButtonLink>
        ) : (
          <Button busy={status.isRunning} onClick={sendNow}>
            Send now
          </Button>
        )}
      </div>
    </Section>
  );
}

function Waiting() {
  const records = useWaitingRecords();
  const [isAll, setAll] = useState(false);
  if (!records || records.length === 0) return null;
  const refusedFirst = [...records].sort((a, b) => rank(a) - rank(b));
  const shown = isAll ? refusedFirst : refusedFirst.slice(0, SHOWN_MAX);
  return (
    <Section
      title={records.length === 1 ? 'One record is only here' : `${records.length} records are only here`}
    >
      <ul className="plain-list">
        {shown.map((record) => (
          <WaitingRow key={`${record.clubId}/${record.type}/${record.id}`} record={record} />
        ))}
      </ul>
      {shown.length < records.length ? (
        <Button look="quiet" onClick={() => setAll(true)}>
          Show all {records.length}
        </Button>
      ) : null}
    </Section>
  );
}

function WaitingRow({ record }: { readonly record: StoredRecord }) {
  const name = waitingName(record);
  return (
    <li className="waiting-row">
      <div>
        <div className="num">
          {record.type === 'reception' ? <Link to={paths.reception(record.id)}>{name}</Link> : name}
        </div>
        <div className="waiting-why">{waitingReason(record.debt!)}</div>
      </div>
      <div className="waiting-why num">since {utcDateTime(record.debt!.since)}</div>
    </li>
  );
}

function rank(record: StoredRecord): number {
  return record.debt?.status === 'refused' ? 0 : 1;
}
