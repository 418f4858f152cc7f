import { useEffect, useMemo, useRef, useState, type ReactNode } from 'react';
import { IDLE_SENDING, SendingContext, type SendingStatus } from '../platform/sending';
import { useActiveLogActions, useActiveLogState } from '../store/active-log';
import { startSyncRunner, type SyncRunner } from './sync-runner';

/** Sends the open account's log for as long as the app is open; a guest's log stays where it is. */
export function SyncProvider({ children }: { children: ReactNode }) {
  const state = useActiveLogState();
  const { refresh } = useActiveLogActions();
  const log = state.kind === 'open' ? state.log : null;
  const [status, setStatus] = useState<SendingStatus>(IDLE_SENDING);
  const runner = useRef<SyncRunner | null>(null);
  const database = log?.database;

  useEffect(() => {
    if (!log?.account) return;
    const channel = new BroadcastChannel(`harkmoor-sync-${log.database.name}`);
    channel.onmessage = (event: MessageEvent<SendingStatus>) => setStatus(event.data);
    const tell = (next: SendingStatus) => {
      setStatus(next);
      if (next.pause !== 'busy') channel.postMessage(next);
    };
    runner.current = startSyncRunner(log, tell, () => void refresh());
    return () => {
      runner.current?.stop();
      runner.current = null;
      channel.close();
      setStatus(IDLE_SENDING);
    };
    // a new log object over the same database (another club shown) must not restart the sending
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [database]);

  const handle = useMemo(() => ({ status, sendNow: () => runner.current?.request() }), [status]);
  return <SendingContext value={handle}>{children}</SendingContext>;
}
