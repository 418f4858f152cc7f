import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { useLiveQuery } from 'dexie-react-hooks';
import { useSending, type SendingStatus } from '../../../platform/sending';
import { useActiveLogState } from '../../../store/active-log';
import type { OpenLog } from '../../../store/open-log';
import { useOwedCount, useOwedRecords } from '../../../store/owed';

export type SendingState =
  | { kind: 'no-log' }
  /** A log without an account: it is here and nowhere else. */
  | { kind: 'guest'; log: OpenLog; waiting: number }
  | {
      kind: 'account';
      log: OpenLog;
      waiting: number;
      refused: number;
      status: SendingStatus;
      /** Server time of the last round in which everything was answered; null before the first. */
      completeAt: number | null;
    };

/** All that a lamp needs: what is only here, what needs attention, and when the server last had everything. */
export function useSendingState(): SendingState {
  const state = useActiveLogState();
  const { status } = useSending();
  const { total, refused } = useOwedCount();
  const database = state.kind === 'open' ? state.log.database : null;
  const clubs = useLiveQuery(async () => (database ? database.clubs.toArray() : []), [database]);
  if (state.kind !== 'open') return { kind: 'no-log' };
  const { log } = state;
  if (!log.account) return { kind: 'guest', log, waiting: total };
  const times = (clubs ?? []).map((club) => club.completeAt);
  const completeAt = times.length === 0 || times.includes(null) ? null : Math.min(...(times as number[]));
  return { kind: 'account', log, waiting: total, refused, status, completeAt };
}

export function useWaitingRecords(): StoredRecord[] | undefined {
  return useOwedRecords();
}
