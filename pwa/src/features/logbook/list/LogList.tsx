import { formatFrequency } from '@harkmoor/sync-model/radio/bands/frequency-text';
import { memo } from 'react';
import { Link } from 'react-router-dom';
import { paths } from '../../../platform/paths';
import { figureText, THIN_SPACE, utcHourMinute } from '../../../platform/utc-text';
import { lineOfPlace, type GroupHead, type ShownRow } from '../index/log-view';
import { headText, outcomeText } from '../view/row-words';
import { ClashMark, RowState } from './RowState';
import { useLines, type LineHeights, type ReadyView } from './use-lines';
import { rowLink, useRowKeys, type RowStop } from './use-row-keys';
import './list.css';

const HEIGHTS: LineHeights = { headRem: 2.75, rowRem: 5.25 };

/** The log on a phone: one row under the other, the outing above them. Only what is in sight is drawn. */
export function LogList({ state, clubId }: { readonly state: ReadyView; readonly clubId: string }) {
  const { heads, shownCount } = state.view;
  const { scroller, virtual, items, lineOf } = useLines(state, HEIGHTS);
  const keys = useRowKeys({
    scroller,
    rowCount: shownCount,
    scrollToPlace: (place) => virtual.scrollToIndex(lineOfPlace(heads, place)),
  });
  const placesInSight = items
    .map(({ index }) => lineOf(index))
    .flatMap((line) => (line.kind === 'row' ? [line.place] : []));
  const stop = placesInSight.includes(keys.active) ? keys.active : placesInSight[0];
  return (
    <div ref={scroller} className="log-scroll" onKeyDown={keys.onKeyDown}>
      <ol
        className="log-lines"
        style={{ height: virtual.getTotalSize() }}
        aria-label="Receptions, newest first"
      >
        {items.map(({ index, start, size }) => {
          const line = lineOf(index);
          return (
            <li
              key={index}
              className="log-line"
              style={{ transform: `translateY(${start}px)`, height: size }}
            >
              {line.kind === 'head' ? (
                <Head head={line.head} />
              ) : (
                <Row
                  row={state.rowAt(line.place)}
                  clubId={clubId}
                  place={line.place}
                  isStop={line.place === stop}
                  onReach={keys.onReach}
                />
              )}
            </li>
          );
        })}
      </ol>
    </div>
  );
}

function Head({ head }: { readonly head: GroupHead }) {
  return (
    <h2 className="log-head">
      <span>{headText(head)}</span>
      <span className="log-head-count num">{figureText(head.count)}</span>
    </h2>
  );
}

type RowProps = {
  readonly row: ShownRow | undefined;
  readonly clubId: string;
} & RowStop;

/** Drawn again only where something of it changed: scrolling moves its neighbours and not itself. */
const Row = memo(function Row({ row, clubId, ...stop }: RowProps) {
  if (!row) return <span className="log-row log-row-coming" aria-hidden="true" />;
  const { figure, unit } = formatFrequency(row.dialHz);
  const note = [`${utcHourMinute(row.deviceAt)}${THIN_SPACE}UTC`, row.antenna, row.operator].filter(Boolean);
  return (
    <Link to={paths.reception(row.id)} className="log-row" {...rowLink(stop)}>
      <span className="log-row-words">
        <span className="log-frequency num">
          {figure} <small>{unit}</small>
        </span>
        <span className="log-station">{row.station}</span>
        <span className="log-note num">{note.join(' · ')}</span>
      </span>
      <span className="log-row-side">
        <span className="log-outcome num">{outcomeText(row)}</span>
        {row.isClash ? <ClashMark /> : null}
        <RowState row={row} clubId={clubId} />
      </span>
    </Link>
  );
});
