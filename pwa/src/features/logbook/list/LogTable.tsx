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
  const lines = items.map(({ index }) => ({ index, line: lineOf(index) }));
  const places = lines.flatMap(({ line }) => (line.kind === 'row' ? [line.place] : []));
  const stop = places.includes(keys.active) ? keys.active : places[0];
  const above = items[0]?.start ?? 0;
  const below = virtual.getTotalSize() - (items.at(-1)?.end ?? 0);
  return (
    <div ref={scroller} className="log-scroll" onKeyDown={keys.onKeyDown}>
      <table className="hm-table log-table" aria-rowcount={shownCount + heads.length + 1}>
        <caption className="only-heard">Receptions, newest first</caption>
        <thead>
          <tr aria-rowindex={1}>
            {COLUMNS.map((name) => (
              <th key={name} scope="col">
                {name}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          <Gap height={above} />
          {lines.map(({ index, line }) =>
            line.kind === 'head' ? (
              <HeadRow key={index} head={line.head} rowIndex={index + 2} />
            ) : (
              <Row
                key={index}
                row={state.rowAt(line.place)}
                rowIndex={index + 2}
                clubId={clubId}
                isOpen={state.rowAt(line.place)?.id === openId}
                rowTo={rowTo}
                place={line.place}
                isStop={line.place === stop}
                onReach={keys.onReach}
              />
            ),
          )}
          <Gap height={below} />
        </tbody>
      </table>
    </div>
  );
}

/** The room of the rows that are not drawn. */
function Gap({ height }: { readonly height: number }) {
  if (height <= 0) return null;
  return (
    <tr aria-hidden="true" className="log-gap">
      <td colSpan={COLUMNS.length} style={{ height }} />
    </tr>
  );
}

function HeadRow({ head, rowIndex }: { readonly head: GroupHead; readonly rowIndex: number }) {
  return (
    <tr aria-rowindex={rowIndex} className="log-head-row">
      <th scope="rowgroup" colSpan={COLUMNS.length}>
        {headText(head)} <span className="log-head-count num">{figureText(head.count)}</span>
      </th>
    </tr>
  );
}

type RowProps = {
  readonly row: ShownRow | undefined;
  readonly rowIndex: number;
  readonly clubId: string;
  readonly isOpen: boolean;
  readonly rowTo: (id: string) => string;
} & RowStop;

/** Drawn again only where something of it changed: scrolling moves its neighbours and not itself. */
const Row = memo(function Row({ row, rowIndex, clubId, isOpen, rowTo, ...stop }: RowProps) {
  if (!row) {
    return (
      <tr aria-rowindex={rowIndex} className="log-table-row">
        <td colSpan={COLUMNS.length}>…</td>
      </tr>
    );
  }
  const { figure, unit } = formatFrequency(row.dialHz);
  const time = utcHourMinute(row.deviceAt);
  return (
    <tr
      aria-rowindex={rowIndex}
      className={isOpen ? 'log-table-row hm-row-leads log-row-open' : 'log-table-row hm-row-leads'}
    >
      <td className="num">
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
      <td className="num log-table-frequency">{`${figure}${THIN_SPACE}${unit}`}</td>
      <td>{row.station}</td>
      <td className="num log-table-outcome">{outcomeText(row)}</td>
      <td>{row.antenna}</td>
      <td>
        {row.isClash ? <ClashMark /> : null}
        <RowState row={row} clubId={clubId} />
      </td>
    </tr>
  );
});
