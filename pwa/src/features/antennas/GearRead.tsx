import type { Antenna } from '@harkmoor/sync-model/records/antenna';
import type { Receiver } from '@harkmoor/sync-model/records/receiver';
import type { SetupRow } from './data/gear';
import { antennaFigures, antennaNote, receiverNote, setupNote } from './gear-words';
import './antennas.css';

/** Gear of others: to be read, not changed. */
export function AntennaRead({ values: antenna }: { readonly values: Antenna }) {
  return <Lines lines={[antennaNote(antenna), ...antennaFigures(antenna), antenna.notes ?? '']} />;
}

export function ReceiverRead({ values: receiver }: { readonly values: Receiver }) {
  return <Lines lines={[receiverNote(receiver), receiver.notes ?? '']} />;
}

export function SetupRead({ row }: { readonly row: SetupRow }) {
  return <Lines lines={[setupNote(row.setup.fields)]} />;
}

function Lines({ lines }: { readonly lines: readonly string[] }) {
  return (
    <>
      {lines
        .filter((line) => line !== '')
        .map((line) => (
          <p key={line}>{line}</p>
        ))}
      <p className="gear-soft">Only its owner may change it.</p>
    </>
  );
}
