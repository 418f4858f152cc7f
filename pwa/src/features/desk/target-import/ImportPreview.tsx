import { frequencyText } from '@harkmoor/sync-model/radio/bands/frequency-text';
import { Section } from '../../../design/layout/Section';
import { DataTable, type Column } from '../../../design/table/DataTable';
import { scheduleText } from '../targets/schedule-text';
import type { ImportFault, NewTarget } from './read-targets';
import '../desk.css';

const FAULTS_SHOWN_MAX = 50;
const PREVIEW_ROWS = 5;

/** What is wrong, by row and column. */
export function FaultList({ faults }: { readonly faults: readonly ImportFault[] }) {
  return (
    <Section title={faults.length === 1 ? 'One fault' : `${faults.length} faults`}>
      <ul className="desk-faults" role="alert">
        {faults.slice(0, FAULTS_SHOWN_MAX).map((fault, at) => (
          <li key={at} className="num">
            Row {fault.row}, {fault.column}: {fault.message}
          </li>
        ))}
      </ul>
      {faults.length > FAULTS_SHOWN_MAX ? <p>and {faults.length - FAULTS_SHOWN_MAX} more.</p> : null}
      <p>Match the columns above, or mend the file and choose it again.</p>
    </Section>
  );
}

const COLUMNS: Column<NewTarget>[] = [
  { key: 'frequency', header: 'Frequency', figures: true, cell: (row) => frequencyText(row.frequencyHz) },
  { key: 'name', header: 'Name', cell: (row) => row.name },
  { key: 'mode', header: 'Mode', cell: (row) => row.mode },
  { key: 'schedule', header: 'On air, UTC', cell: (row) => scheduleText(row.schedule) },
  {
    key: 'tx',
    header: 'Transmitter',
    figures: true,
    cell: (row) => (row.tx ? `${row.tx.latDeg}, ${row.tx.lonDeg}` : 'not known'),
  },
];

/** How the first rows will stand in the list. */
export function TargetPreview({ targets }: { readonly targets: readonly NewTarget[] }) {
  return (
    <Section title={`The first ${Math.min(PREVIEW_ROWS, targets.length)} of ${targets.length} targets`}>
      <DataTable
        caption="How the targets will stand in the list"
        columns={COLUMNS}
        rows={targets.slice(0, PREVIEW_ROWS)}
        rowKey={(row) => `${row.name} ${row.frequencyHz} ${row.mode}`}
      />
    </Section>
  );
}
