import { useSyncExternalStore } from 'react';
import type { Workbox } from 'workbox-window';
import { nowMs } from '../../platform/clock';
import { whenIdle } from '../../platform/idle';
import { keepFineMap } from '../../platform/map-data';
import { anyUnsavedWork, onAllSaved } from '../../platform/unsaved-work';
import { onVisibilityChange } from '../../platform/visibility';

const LOOK_AGAIN_MS = 60 * 60 * 1000;
let waiting: Workbox | null = null;
const listeners = new Set<() => void>();

/**
 * Registers the service worker. A new version waits until the person takes it, or until the page is hidden with no
 * form open; it never reloads a page that holds something unsaved.
 */
export async function registerWorker(): Promise<void> {
  if (!import.meta.env.PROD || !('serviceWorker' in navigator)) return;
  const wasControlled = navigator.serviceWorker.controller !== null;
  navigator.serviceWorker.addEventListener('controllerchange', () => {
    if (wasControlled || waiting) reloadWhenSaved();
  });
  const { Workbox } = await import('workbox-window');
  const workbox = new Workbox('/sw.js');
  workbox.addEventListener('waiting', () => {
    waiting = workbox;
    tellAll();
  });
  followVisibility(workbox);
  void navigator.serviceWorker.ready.then(({ active }) => {
    // a page that was just being opened when the worker claimed all pages was passed over
    if (!navigator.serviceWorker.controller) active?.postMessage({ type: 'CLAIM' });
    whenIdle(() => void keepFineMap());
  });
  await workbox.register();
}

/** A page that is put away takes the waiting version; one that comes back looks for a new one, hourly at most. */
function followVisibility(workbox: Workbox): void {
  let lookedAtMs = nowMs();
  onVisibilityChange((visible) => {
    if (!visible && waiting && !anyUnsavedWork()) applyUpdate();
    if (!visible || nowMs() - lookedAtMs < LOOK_AGAIN_MS) return;
    lookedAtMs = nowMs();
    workbox.update().catch(() => undefined); // no signal: the next look comes
  });
}

/** Lets the waiting version take over; the page reloads once it has. */
export function applyUpdate(): void {
  waiting?.messageSkipWaiting();
}

/** True while a new version waits. */
export function useUpdateReady(): boolean {
  return useSyncExternalStore(subscribe, () => waiting !== null);
}

/** Another tab may have taken the new version: this one follows as soon as nothing typed would be lost. */
function reloadWhenSaved(): void {
  if (!anyUnsavedWork()) location.reload();
  else onAllSaved(() => location.reload());
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

function tellAll(): void {
  for (const listener of listeners) listener();
}
