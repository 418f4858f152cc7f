import { SendStateMark } from '../../../design/states/SendStateMark';
import { useSending } from '../../../platform/sending';
import type { ShownRow } from '../index/log-view';
import { sendStateOfRow } from '../view/row-words';
import './list.css';

type RowStateProps = { readonly row: Pick<ShownRow, 'id' | 'owed'>; readonly clubId: string };

/** Where a reception is: a shape and a word. */
export function RowState({ row, clubId }: RowStateProps) {
  const { status } = useSending();
  return (
    <SendStateMark state={sendStateOfRow(row.owed, status.inFlight.has(`${clubId}/reception/${row.id}`))} />
  );
}

/** Stands where a value met another that its writer had not seen. */
export function ClashMark() {
  return (
    <span className="log-clash">
      <svg width="14" height="14" viewBox="0 0 14 14" aria-hidden="true">
        <path d="M1 4h9L7 1M13 10H4l3 3" fill="none" stroke="currentColor" strokeWidth="2" />
      </svg>
      changed elsewhere
    </span>
  );
}
