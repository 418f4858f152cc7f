import { useRef, useState } from 'react';
import { Button } from '../../design/button/Button';
import { Section } from '../../design/layout/Section';
import { NoticeLine } from '../../design/notice/NoticeLine';
import { useSending } from '../../platform/sending';
import { shareFile } from '../../platform/share-file';
import { readInUnsentFile, unsentFile } from './data/unsent-file';
import type { SendingState } from './data/use-sending-state';
import './sync-status.css';

type Log = Exclude<SendingState, { kind: 'no-log' }>['log'];

/** Keeps what is only here as a file, and reads such a file in again. */
export function UnsentFile({ log }: { readonly log: Log }) {
  const input = useRef<HTMLInputElement>(null);
  const { sendNow } = useSending();
  const [notice, setNotice] = useState<string | null>(null);

  async function keep(): Promise<void> {
    const file = await unsentFile(log, Date.now());
    if (file.count === 0) return setNotice('Nothing is only here: there is nothing to keep.');
    const outcome = await shareFile(new File([file.text], file.name, { type: 'application/json' }));
    if (outcome === 'cancelled') return setNotice('No file was kept.');
    setNotice(`${file.count} records are in ${file.name}. They stay on this phone and are still sent.`);
  }

  async function readIn(file: File | undefined): Promise<void> {
    if (!file) return;
    const read = await readInUnsentFile(log, await file.text());
    if (input.current) input.current.value = '';
    if (read.kind === 'read' && read.added > 0) sendNow();
    setNotice(
      read.kind === 'refused'
        ? read.message
        : `${read.added} records read in; ${read.known} were on this phone already.`,
    );
  }

  return (
    <Section title="As a file">
      <p className="waiting-why">
        The last resort for a broken or borrowed phone: everything that is only here, in one file. It holds
        exact positions; keep it to yourself.
      </p>
      <div className="waiting-acts">
        <Button look="outline" onClick={() => void keep()}>
          Keep unsent records as a file
        </Button>
        <Button look="outline" onClick={() => input.current?.click()}>
          Read in a file
        </Button>
        <input
          ref={input}
          type="file"
          accept="application/json,.json"
          hidden
          aria-label="File of unsent records"
          onChange={(event) => void readIn(event.target.files?.[0])}
        />
      </div>
      <NoticeLine text={notice} />
    </Section>
  );
}
