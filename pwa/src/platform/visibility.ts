import { useSyncExternalStore } from 'react';

/** False while the screen is off, locked or on another tab: clocks and watches rest then. */
export function isVisible(): boolean {
  return document.visibilityState === 'visible';
}

/** Calls back on each change; returns how to stop. */
export function onVisibilityChange(listener: (visible: boolean) => void): () => void {
  const tell = (): void => listener(isVisible());
  document.addEventListener('visibilitychange', tell);
  return () => document.removeEventListener('visibilitychange', tell);
}

export function useVisible(): boolean {
  return useSyncExternalStore(onVisibilityChange, isVisible);
}
