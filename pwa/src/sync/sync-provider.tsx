import { createContext, use, useEffect, useMemo, useRef, useState, type ReactNode } from 'react';
import { useActiveLogActions, useActiveLogState } from '../store/active-log';
import { IDLE_STATUS, startSyncRunner, type SyncRunner, type SyncStatus } from './sync-runner';

type SyncHandle = { status: SyncStatus; sendNow(): void };

const SyncContext = createContext<SyncHandle>({ status: IDLE_STATUS, sendNow: () => undefined });

/** Sends the open account's log for as long as the app is open; a guest's log stays where it is. */
export function SyncProvider({ children }: { children: ReactNode }) {
  const state = useActiveLogState();
  const { refresh } = useActiveLogActions();
  const log = state.kind === 'open' ? state.log : null;
  const [status, setStatus] = useState<SyncStatus>(IDLE_STATUS);
  const runner = useRef<SyncRunner | null>(null);
  const database = log?.database;

  useEffect(() => {
    if (!log?.account) return;
    const channel = new BroadcastChannel(`harkmoor-sync-${log.database.name}`);
    channel.onmessage = (event: MessageEvent<SyncStatus>) => setStatus(event.data);
    const tell = (next: SyncStatus) => {
      setStatus(next);
      if (next.pause !== 'busy') channel.postMessage(next);
    };
    runner.current = startSyncRunner(log, tell, () => void refresh());
    return () => {
      runner.current?.stop();
      runner.current = null;
      channel.close();
      setStatus(IDLE_STATUS);
    };
    // a new log object over the same database (another club shown) must not restart the sending
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [database]);

  const handle = useMemo(() => ({ status, sendNow: () => runner.current?.request() }), [status]);
  return <SyncContext value={handle}>{children}</SyncContext>;
}

export function useSync(): SyncHandle {
  return use(SyncContext);
}
