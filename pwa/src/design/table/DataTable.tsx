import { useState, type KeyboardEvent, type ReactNode } from 'react';
import { Link } from 'react-router-dom';
import './table.css';

export type Column<Row> = {
  readonly key: string;
  readonly header: string;
  readonly cell: (row: Row) => ReactNode;
  /** What the column is sorted by; without it the column cannot be sorted. Null goes last, either way. */
  readonly sortBy?: (row: Row) => number | string | null;
  /** Right-aligned figures of one width. */
  readonly figures?: boolean;
};

export type SortOrder = { readonly key: string; readonly descending: boolean };

type DataTableProps<Row> = {
  /** What the table holds; read by screen readers, and shown above it when `showCaption`. */
  readonly caption: string;
  readonly showCaption?: boolean;
  readonly columns: readonly Column<Row>[];
  readonly rows: readonly Row[];
  readonly rowKey: (row: Row) => string;
  /** Where a row leads: its first cell becomes the link, and the whole row the target. */
  readonly rowTo?: (row: Row) => string;
  readonly startOrder?: SortOrder;
};

/**
 * A real table: headers sort by keyboard, arrow keys walk the rows where they lead somewhere, and it scrolls
 * sideways by itself on a narrow screen.
 */
export function DataTable<Row>(props: DataTableProps<Row>) {
  const [order, setOrder] = useState<SortOrder | null>(props.startOrder ?? null);
  const rows = order ? sortedRows(props.rows, props.columns, order) : props.rows;
  return (
    <div className="hm-table-scroll" role="region" aria-label={props.caption} tabIndex={0}>
      <table className="hm-table" onKeyDown={walkRows}>
        <caption className={props.showCaption ? undefined : 'only-heard'}>{props.caption}</caption>
        <thead>
          <tr>
            {props.columns.map((column) => (
              <HeaderCell key={column.key} column={column} order={order} onSort={setOrder} />
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={props.rowKey(row)} className={props.rowTo ? 'hm-row-leads' : undefined}>
              {props.columns.map((column, index) => (
                <td key={column.key} className={column.figures ? 'num hm-figures' : undefined}>
                  {index === 0 && props.rowTo ? (
                    <Link to={props.rowTo(row)}>{column.cell(row)}</Link>
                  ) : (
                    column.cell(row)
                  )}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

type HeaderCellProps<Row> = {
  readonly column: Column<Row>;
  readonly order: SortOrder | null;
  readonly onSort: (order: SortOrder) => void;
};

function HeaderCell<Row>({ column, order, onSort }: HeaderCellProps<Row>) {
  const isSorted = order?.key === column.key;
  const direction = isSorted ? (order.descending ? 'descending' : 'ascending') : undefined;
  return (
    <th scope="col" className={column.figures ? 'hm-figures' : undefined} aria-sort={direction}>
      {column.sortBy ? (
        <button
          type="button"
          onClick={() =>
            onSort({ key: column.key, descending: isSorted ? !order.descending : column.figures === true })
          }
        >
          {column.header}
          <span aria-hidden="true">
            {direction === undefined ? ' ↕' : direction === 'ascending' ? ' ↑' : ' ↓'}
          </span>
        </button>
      ) : (
        column.header
      )}
    </th>
  );
}

/** Rows in a column's order; equal ones keep their order, and rows without a value go last either way. */
export function sortedRows<Row>(
  rows: readonly Row[],
  columns: readonly Column<Row>[],
  order: SortOrder,
): Row[] {
  const sortBy = columns.find((column) => column.key === order.key)?.sortBy;
  if (!sortBy) return [...rows];
  const sign = order.descending ? -1 : 1;
  return [...rows].sort((a, b) => {
    const [x, y] = [sortBy(a), sortBy(b)];
    if (x === null || y === null) return Number(x === null) - Number(y === null);
    if (typeof x === 'number' && typeof y === 'number') return sign * (x - y);
    return sign * String(x).localeCompare(String(y), 'en');
  });
}

function walkRows(event: KeyboardEvent<HTMLTableElement>): void {
  const step = event.key === 'ArrowDown' ? 1 : event.key === 'ArrowUp' ? -1 : 0;
  if (step === 0 || !(event.target instanceof HTMLAnchorElement)) return;
  const links = [...event.currentTarget.querySelectorAll<HTMLAnchorElement>('tbody a')];
  const next = links[links.indexOf(event.target) + step];
  if (!next) return;
  event.preventDefault();
  next.focus();
}
