import { useSyncExternalStore } from 'react';

const WIDE = '(min-width: 1024px)';

/** True where there is room for two panes. */
export function useWide(): boolean {
  return useSyncExternalStore(
    (listener) => {
      const query = window.matchMedia(WIDE);
      query.addEventListener('change', listener);
      return () => query.removeEventListener('change', listener);
    },
    () => window.matchMedia(WIDE).matches,
  );
}
