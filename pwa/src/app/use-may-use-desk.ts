import { useActiveLogState } from '../store/active-log';

/** Whether the open club has a Desk for this person: organizers and admins. */
export function useMayUseDesk(): boolean {
  const state = useActiveLogState();
  return state.kind === 'open' && state.log.role !== 'member';
}
