import { useSyncExternalStore } from 'react';

/**
 * What the device believes about the network. False is certain (no network at all); true is only a hint: a network
 * without signal to the server looks the same. Nothing is ever refused because of it.
 */
export function maybeOnline(): boolean {
  return navigator.onLine;
}

export function onOnlineHint(listener: () => void): () => void {
  window.addEventListener('online', listener);
  window.addEventListener('offline', listener);
  return () => {
    window.removeEventListener('online', listener);
    window.removeEventListener('offline', listener);
  };
}

export function useMaybeOnline(): boolean {
  return useSyncExternalStore(onOnlineHint, maybeOnline);
}
