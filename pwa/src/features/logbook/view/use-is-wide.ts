import { useSyncExternalStore } from 'react';

const WIDE = '(min-width: 1024px)';

/** True from the width at which the list and a record stand side by side. */
export function useIsWide(): boolean {
  return useSyncExternalStore(onWidth, () => window.matchMedia(WIDE).matches);
}

function onWidth(listener: () => void): () => void {
  const query = window.matchMedia(WIDE);
  query.addEventListener('change', listener);
  return () => query.removeEventListener('change', listener);
}
