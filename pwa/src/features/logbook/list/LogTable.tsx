import { formatFrequency } from '@harkmoor/sync-model/radio/bands/frequency-text';
import { memo } from 'react';
import { Link } from 'react-router-dom';
import { figureText, THIN_SPACE, utcHourMinute } from '../../../platform/utc-text';
import { lineOfPlace, type GroupHead, type ShownRow } from '../index/log-view';
import { headText, outcomeText, spokenFrequency } from '../view/row-words';
import { ClashMark, RowState } from './RowState';
import { useLines, type LineHeights, type ReadyView } from './use-lines';
import { rowLink, useRowKeys, type RowStop } from './use-row-keys';
import '../../../design/table/table.css';
import './list.css';

const HEIGHTS: LineHeights = { headRem: 2.75, rowRem: 2.75 };
const COLUMNS = ['UTC', 'Frequency', 'Station', 'Outcome', 'Antenna', 'State'] as const;

type LogTableProps = {
  readonly state: ReadyView;
  readonly clubId: string;
  readonly openId: string | null;
  /** The address that opens a row beside the table. */
  readonly rowTo: (id: string) => string;
};

/** The log on a laptop: a real table of which only the rows in sight are drawn; it says how many there are. */
export function LogTable({ state, clubId, openId, rowTo }: LogTableProps) {
  const { heads, shownCount } = state.view;
  const { scroller, virtual, items, lineOf } = useLines(state, HEIGHTS);
  const keys = useRowKeys({
    scroller,
    rowCount: shownCount,
    scrollToPlace: (place) => virtual.scrollToIndex(lineOfPlace(heads, place)),
  });
  const lines = items.map(({ index, start }) => ({ index, start, line: lineOf(index) }));
  const places = lines.flatMap(({ line }) => (line.kind === 'row' ? [line.place] : []));
  const stop = places.includes(keys.active) ? keys.active : places[0];
  return (
    <div ref={scroller} className="log-scroll" onKeyDown={keys.onKeyDown}>
      <table role="table" className="hm-table log-table" aria-rowcount={shownCount + heads.length + 1}>
        <caption className="only-heard">Receptions, newest first</caption>
        <thead role="rowgroup">
          <tr role="row" aria-rowindex={1}>
            {COLUMNS.map((name) => (
              <th key={name} role="columnheader" scope="col">
                {name}
              </th>
            ))}
          </tr>
        </thead>
        <tbody role="rowgroup" style={{ height: virtual.getTotalSize() }}>
          {lines.map(({ index, start, line }) =>
            line.kind === 'head' ? (
              <HeadRow key={index} head={line.head} rowIndex={index + 2} startPx={start} />
            ) : (
              <Row
                key={index}
                row={state.rowAt(line.place)}
                rowIndex={index + 2}
                startPx={start}
                clubId={clubId}
                isOpen={state.rowAt(line.place)?.id === openId}
                rowTo={rowTo}
                place={line.place}
                isStop={line.place === stop}
                onReach={keys.onReach}
              />
            ),
          )}
        </tbody>
      </table>
    </div>
  );
}

/** Where a line stands: laid out by itself, so that what comes into sight moves no other row. */
const placedAt = (startPx: number) => ({ transform: `translateY(${startPx}px)` });

type HeadRowProps = { readonly head: GroupHead; readonly rowIndex: number; readonly startPx: number };

function HeadRow({ head, rowIndex, startPx }: HeadRowProps) {
  return (
    <tr role="row" aria-rowindex={rowIndex} className="log-head-row" style={placedAt(startPx)}>
      <th role="rowheader" scope="rowgroup" aria-colspan={COLUMNS.length} colSpan={COLUMNS.length}>
        {headText(head)} <span className="log-head-count num">{figureText(head.count)}</span>
      </th>
    </tr>
  );
}

type RowProps = {
  readonly row: ShownRow | undefined;
  readonly rowIndex: number;
  readonly startPx: number;
  readonly clubId: string;
  readonly isOpen: boolean;
  readonly rowTo: (id: string) => string;
} & RowStop;

/** Drawn again only where something of it changed: scrolling moves its neighbours and not itself. */
const Row = memo(function Row({ row, rowIndex, startPx, clubId, isOpen, rowTo, ...stop }: RowProps) {
  if (!row) {
    return (
      <tr role="row" aria-rowindex={rowIndex} className="log-table-row" style={placedAt(startPx)}>
        <td role="cell" aria-colspan={COLUMNS.length} colSpan={COLUMNS.length}>
          …
        </td>
      </tr>
    );
  }
  const { figure, unit } = formatFrequency(row.dialHz);
  const time = utcHourMinute(row.deviceAt);
  return (
    <tr
      role="row"
      style={placedAt(startPx)}
      aria-rowindex={rowIndex}
      className={isOpen ? 'log-table-row hm-row-leads log-row-open' : 'log-table-row hm-row-leads'}
    >
      <td role="cell" className="num">
        <Link
          to={rowTo(row.id)}
          replace
          aria-current={isOpen || undefined}
          aria-label={`${time} UTC, ${spokenFrequency(row.dialHz)}, ${row.station}`}
          {...rowLink(stop)}
        >
          {time}
        </Link>
      </td>
      <td role="cell" className="num log-table-frequency">{`${figure}${THIN_SPACE}${unit}`}</td>
      <td role="cell">{row.station}</td>
      <td role="cell" className="num log-table-outcome">
        {outcomeText(row)}
      </td>
      <td role="cell">{row.antenna}</td>
      <td role="cell">
        {row.isClash ? <ClashMark /> : null}
        <RowState row={row} clubId={clubId} />
      </td>
    </tr>
  );
});
