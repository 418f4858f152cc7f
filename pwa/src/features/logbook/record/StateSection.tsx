import { sendStateOf } from '@harkmoor/sync-model/device/stored-record';
import { stampOf } from '@harkmoor/sync-model/merge/record-state';
import { stampWallMs } from '@harkmoor/sync-model/stamp/stamp';
import { useState } from 'react';
import { Button } from '../../../design/button/Button';
import { ButtonLink } from '../../../design/button/ButtonLink';
import { useSay } from '../../../design/notice/notices';
import { SendStateMark } from '../../../design/states/SendStateMark';
import { paths } from '../../../platform/paths';
import { useSending } from '../../../platform/sending';
import { utcDateTime } from '../../../platform/utc-text';
import type { HeldReception } from '../data/held-reception';
import type { ReceptionActs } from '../data/use-reception-acts';
import { BIN_MS } from '../index/log-filter';
import { ownerWords } from './AboutSection';

type StateSectionProps = { readonly held: HeldReception; readonly acts: ReceptionActs };

/** Where the record is, why it waits, and what its owner may do with it. */
export function StateSection({ held, acts }: StateSectionProps) {
  const { record, clubId, isOwn } = held;
  const { status } = useSending();
  const state = sendStateOf(record, status.inFlight.has(`${clubId}/reception/${record.id}`));
  const { debt } = record;
  return (
    <div className="log-state">
      <SendStateMark state={state} />
      {debt?.status === 'refused' ? (
        <p className="log-refused">
          {debt.message ?? 'The server did not take it.'} Edit it, and it is sent again. It stays on this
          device.
        </p>
      ) : null}
      {debt?.status === 'held' ? <p className="soft small">Goes after the record it belongs to.</p> : null}
      {held.ownId === null ? (
        <p className="soft small">This log has no account: it is on this device alone.</p>
      ) : null}
      {record.fields.deleted ? <p className="log-binned num">{binWords(held)}</p> : null}
      {isOwn ? (
        <OwnActs held={held} acts={acts} />
      ) : (
        <p className="soft">{ownerWords(held)} made this entry and alone may change it.</p>
      )}
    </div>
  );
}

function binWords({ record }: HeldReception): string {
  const binnedAt = stampWallMs(stampOf(record, 'deleted'));
  return `In the bin since ${utcDateTime(binnedAt)}. It goes for good on ${utcDateTime(binnedAt + BIN_MS)}.`;
}

function OwnActs({ held, acts }: StateSectionProps) {
  const say = useSay();
  const [isBusy, setBusy] = useState(false);
  const { record } = held;
  const run = async (act: () => Promise<void>, done: string, undo: () => Promise<void>): Promise<void> => {
    setBusy(true);
    try {
      await act();
      say(done, { label: 'Undo', run: () => void undo() });
    } catch (error) {
      console.error('the entry could not be changed', error);
      say('That could not be stored. Free some space on this device and try again.');
    } finally {
      setBusy(false);
    }
  };
  if (record.fields.deleted) {
    return (
      <div className="log-acts">
        <Button busy={isBusy} onClick={() => void run(acts.restore, 'Back in the log', acts.bin)}>
          Restore
        </Button>
      </div>
    );
  }
  return (
    <div className="log-acts">
      <ButtonLink to={paths.pad({ receptionId: record.id })} look="outline">
        Edit
      </ButtonLink>
      <Button
        look="danger"
        busy={isBusy}
        onClick={() => void run(acts.bin, 'Moved to the bin', acts.restore)}
      >
        Delete
      </Button>
    </div>
  );
}
