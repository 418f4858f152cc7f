import { useState } from 'react';
import type { DialRingFigures } from '../../../design/charts/HourDial';
import { DataTable } from '../../../design/table/DataTable';

type DialTableProps = { readonly rings: readonly DialRingFigures[]; readonly place: string };

/** The dial once more as a table: an hour a row, a ring a column, each figure with its sample. */
export function DialTable({ rings, place }: DialTableProps) {
  const [isOpen, setOpen] = useState(false);
  const hours = Array.from({ length: 24 }, (_, hour) => hour);
  return (
    <details className="cov-twin" onToggle={(event) => setOpen(event.currentTarget.open)}>
      <summary>The dial as a table</summary>
      {isOpen ? (
        <DataTable
          caption={`Heard rates of ${place} by UTC hour`}
          rows={hours}
          rowKey={String}
          columns={[
            { key: 'hour', header: 'UTC', cell: (hour) => String(hour).padStart(2, '0') },
            ...rings.map(({ key, label, cells }) => ({
              key,
              header: label,
              figures: true,
              cell: (hour: number) => (cells[hour]?.isTried ? cells[hour].words : '–'),
            })),
          ]}
        />
      ) : null}
    </details>
  );
}
