import { useEffect, useMemo, useRef, useState, type ReactNode } from 'react';
import { onSessionTold } from '../platform/api/access-token';
import { IDLE_SENDING, SendingContext, type SendingStatus } from '../platform/sending';
import { useActiveLogActions, useActiveLogState } from '../store/active-log';
import { SETTING, type OpenLog } from '../store/open-log';
import type { SyncRunner } from './sync-runner';

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
    let isOver = false;
    const channel = new BroadcastChannel(`harkmoor-sync-${log.database.name}`);
    channel.onmessage = (event: MessageEvent<SendingStatus>) => setStatus(event.data);
    const tell = (next: SendingStatus) => {
      setStatus(next);
      if (next.pause !== 'busy') channel.postMessage(next);
    };
    // the engine is not needed for Field to be usable, so it comes after the first screen
    void import('./sync-runner').then(({ startSyncRunner }) => {
      if (!isOver) runner.current = startSyncRunner(log, tell, () => void refresh());
    });
    const stopTelling = keepAccountCurrent(log, () => void refresh());
    return () => {
      isOver = true;
      runner.current?.stop();
      runner.current = null;
      stopTelling();
      channel.close();
      setStatus(IDLE_SENDING);
    };
    // eslint-disable-next-line react-hooks/exhaustive-deps -- another log object over the same database (another club shown) must not restart the sending
  }, [database]);

  const handle = useMemo(() => ({ status, sendNow: () => runner.current?.request() }), [status]);
  return <SendingContext value={handle}>{children}</SendingContext>;
}

/** A renewed session tells the account's name and whether its address is confirmed by now. */
function keepAccountCurrent(log: OpenLog, afterwards: () => void): () => void {
  return onSessionTold(({ account }) => {
    if (account.id !== log.account?.id || !log.database.isOpen()) return;
    void log.database.settings.put({ name: SETTING.account, value: account }).then(afterwards);
  });
}
