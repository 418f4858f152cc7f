import { useOwedCount } from '../../../store/owed';

/** How many records of the open log the server does not have yet. */
export function useUnsent(): number {
  return useOwedCount().total;
}
