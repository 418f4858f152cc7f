import { useLiveQuery } from 'dexie-react-hooks';
import { useActiveLogActions, useActiveLogState, type ActiveLogActions } from '../../../store/active-log';
import { countGuestReceptions } from '../../../store/guest-takeover';
import type { KnownAccount, OpenLog } from '../../../store/open-log';

export type AccountView =
  | { kind: 'opening' }
  | { kind: 'failed'; error: unknown }
  /** Nothing on this phone yet. */
  | { kind: 'none'; actions: ActiveLogActions }
  | { kind: 'guest'; log: OpenLog; actions: ActiveLogActions }
  | { kind: 'account'; log: OpenLog; account: KnownAccount; actions: ActiveLogActions };

/** Who uses this phone, as the account's screens need it. */
export function useAccount(): AccountView {
  const state = useActiveLogState();
  const actions = useActiveLogActions();
  if (state.kind === 'open') {
    const { log } = state;
    return log.account
      ? { kind: 'account', log, account: log.account, actions }
      : { kind: 'guest', log, actions };
  }
  return state.kind === 'none' ? { kind: 'none', actions } : state;
}

/** How many receptions wait on this phone to be taken over at a sign-in. */
export function useGuestReceptions(): number {
  return useLiveQuery(countGuestReceptions, []) ?? 0;
}
