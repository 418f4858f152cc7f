import { useCallback } from 'react';
import { useSay } from '../../design/notice/notices';

/** Runs what writes to the log. Where the phone refuses (storage full, log closed) it says so: nothing fails silently. */
export function useAct(): (work: () => Promise<unknown>) => Promise<boolean> {
  const say = useSay();
  return useCallback(
    async (work) => {
      try {
        await work();
        return true;
      } catch (error) {
        console.error('An entry could not be written', error);
        const why = error instanceof Error ? error.message : String(error);
        say(`Not saved: the phone refused to write (${why}). Free some space and try again.`);
        return false;
      }
    },
    [say],
  );
}
