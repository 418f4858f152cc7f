import { useActiveLog } from '../../../store/active-log';

/** The club whose log is shown. */
export function useClubId(): string {
  return useActiveLog().clubId;
}
