import { useSyncExternalStore } from 'react';

/** The browser's own offer to install, which it gives only once and only sometimes. */
type InstallEvent = Event & {
  prompt(): Promise<void>;
  readonly userChoice: Promise<{ readonly outcome: 'accepted' | 'dismissed' }>;
};

/** `by-hand`: this browser installs only from its own share menu. */
export type InstallOffer = 'installed' | 'can-ask' | 'by-hand' | 'none';

let kept: InstallEvent | null = null;
const listeners = new Set<() => void>();

/** Keeps the browser's offer instead of letting it pop up in the middle of an entry. Call once, early. */
export function keepInstallOffer(): void {
  window.addEventListener('beforeinstallprompt', (event) => {
    event.preventDefault();
    kept = event as InstallEvent;
    tellAll();
  });
  window.addEventListener('appinstalled', () => {
    kept = null;
    tellAll();
  });
}

/** Shows the browser's question; must come from a tap. True when it was accepted. */
export async function askToInstall(): Promise<boolean> {
  if (!kept) return false;
  const offer = kept;
  kept = null;
  await offer.prompt();
  const { outcome } = await offer.userChoice;
  tellAll();
  return outcome === 'accepted';
}

export function useInstallOffer(): InstallOffer {
  return useSyncExternalStore(subscribe, installOffer);
}

function installOffer(): InstallOffer {
  const isApple = 'standalone' in navigator;
  if (window.matchMedia('(display-mode: standalone)').matches) return 'installed';
  if (isApple && (navigator as { standalone?: boolean }).standalone === true) return 'installed';
  if (kept) return 'can-ask';
  return isApple ? 'by-hand' : 'none';
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

function tellAll(): void {
  for (const listener of listeners) listener();
}
