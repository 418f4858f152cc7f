import { createContext, use, useCallback, useEffect, useMemo, useState, type ReactNode } from 'react';
import {
  openAccountLog,
  openGuestLog,
  SETTING,
  type KnownAccount,
  type KnownClub,
  type OpenLog,
} from './open-log';
import { openLogName, rememberOpenLog } from './this-device';

export type ActiveLogState =
  | { kind: 'opening' }
  /** No log on this phone yet: offer to start one here, or to sign in. */
  | { kind: 'none' }
  | { kind: 'open'; log: OpenLog }
  | { kind: 'failed'; error: unknown };

export type ActiveLogActions = {
  startGuestLog(): Promise<OpenLog>;
  openAccount(told: { account: KnownAccount; clubs: readonly KnownClub[] }): Promise<OpenLog>;
  /** Shows another club of the same account; works offline. */
  showClub(clubId: string): Promise<void>;
  /** Reads account, role and club card again after a round has changed them. */
  refresh(): Promise<void>;
  /** Shows no log; the database stays on the phone. */
  close(): void;
};

const StateContext = createContext<ActiveLogState>({ kind: 'opening' });
const ActionsContext = createContext<ActiveLogActions | null>(null);

export function ActiveLogProvider({ children }: { children: ReactNode }) {
  const [state, setState] = useState<ActiveLogState>({ kind: 'opening' });

  const show = useCallback((log: OpenLog) => {
    rememberOpenLog(log.account?.id ?? 'guest');
    setState((previous) => {
      if (previous.kind === 'open' && previous.log.database !== log.database) previous.log.database.close();
      return { kind: 'open', log };
    });
    return log;
  }, []);

  useEffect(() => {
    let isCurrent = true;
    reopen().then(
      (log) => isCurrent && setState(log ? { kind: 'open', log } : { kind: 'none' }),
      (error: unknown) => isCurrent && setState({ kind: 'failed', error }),
    );
    return () => {
      isCurrent = false;
    };
  }, []);

  const openLog = state.kind === 'open' ? state.log : null;
  const actions = useMemo<ActiveLogActions>(() => {
    const again = async () => {
      if (openLog) show(await openLog.reload());
    };
    return {
      startGuestLog: async () => show(await openGuestLog()),
      openAccount: async (told) => show((await openAccountLog(told.account.id, told))!),
      showClub: async (clubId) => {
        await openLog?.database.settings.put({ name: SETTING.clubId, value: clubId });
        await again();
      },
      refresh: again,
      close: () => {
        rememberOpenLog(null);
        openLog?.database.close();
        setState({ kind: 'none' });
      },
    };
  }, [openLog, show]);

  return (
    <StateContext value={state}>
      <ActionsContext value={actions}>{children}</ActionsContext>
    </StateContext>
  );
}

async function reopen(): Promise<OpenLog | null> {
  const name = openLogName();
  if (name === null) return null;
  return name === 'guest' ? openGuestLog() : openAccountLog(name);
}

export function useActiveLogState(): ActiveLogState {
  return use(StateContext);
}

export function useActiveLogActions(): ActiveLogActions {
  const actions = use(ActionsContext);
  if (!actions) throw new Error('useActiveLogActions needs an ActiveLogProvider above it');
  return actions;
}

/** The open log; only for screens that the shell shows once a log is open. */
export function useActiveLog(): OpenLog {
  const state = use(StateContext);
  if (state.kind !== 'open') throw new Error('this screen needs an open log');
  return state.log;
}
