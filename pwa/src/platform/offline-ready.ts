import { useEffect, useState } from 'react';
import { isVisible } from './visibility';

/** Whether the application and its map are on the device, looked at and not assumed. */
export type OfflineReadiness =
  | { readonly kind: 'checking' }
  /** Each installed file was found in the cache. */
  | { readonly kind: 'ready'; readonly files: number }
  /** Still being fetched, or a browser cleared some of it. */
  | { readonly kind: 'incomplete'; readonly missing: number; readonly files: number }
  /** This browser cannot keep the application (private window, blocked storage, development server). */
  | { readonly kind: 'cannot' };

const ANSWER_LIMIT_MS = 5000;
const ASK_AGAIN_MS = 3000;

/** Asks the service worker to look up each installed file in the cache. */
export async function checkOfflineReady(): Promise<OfflineReadiness> {
  const worker = navigator.serviceWorker?.controller;
  if (!('serviceWorker' in navigator)) return { kind: 'cannot' };
  if (!worker) {
    const registration = await navigator.serviceWorker.getRegistration();
    return registration ? { kind: 'checking' } : { kind: 'cannot' };
  }
  const answer = await ask(worker);
  if (answer === null) return { kind: 'checking' };
  const { missing, total } = answer;
  return missing === 0 ? { kind: 'ready', files: total } : { kind: 'incomplete', missing, files: total };
}

/** The readiness as it changes: asked at once, again every few seconds while it is not complete, and on a new worker. */
export function useOfflineReady(): OfflineReadiness {
  const [readiness, setReadiness] = useState<OfflineReadiness>({ kind: 'checking' });
  useEffect(() => {
    let isWanted = true;
    let timer: ReturnType<typeof setTimeout> | undefined;
    const look = async (): Promise<void> => {
      clearTimeout(timer);
      const next = isVisible() ? await checkOfflineReady() : null;
      if (!isWanted) return;
      if (next) setReadiness(next);
      if (next?.kind !== 'ready') timer = setTimeout(() => void look(), ASK_AGAIN_MS);
    };
    const lookAgain = (): void => void look();
    void look();
    navigator.serviceWorker?.addEventListener('controllerchange', lookAgain);
    return () => {
      isWanted = false;
      clearTimeout(timer);
      navigator.serviceWorker?.removeEventListener('controllerchange', lookAgain);
    };
  }, []);
  return readiness;
}

type Answer = { readonly missing: number; readonly total: number };

function ask(worker: ServiceWorker): Promise<Answer | null> {
  return new Promise((resolve) => {
    const { port1, port2 } = new MessageChannel();
    const timer = setTimeout(() => resolve(null), ANSWER_LIMIT_MS);
    port1.onmessage = (event: MessageEvent<Answer>) => {
      clearTimeout(timer);
      port1.close();
      resolve(event.data);
    };
    worker.postMessage({ type: 'COUNT_MISSING' }, [port2]);
  });
}
