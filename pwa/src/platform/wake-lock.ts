import { isVisible, onVisibilityChange } from './visibility';

/**
 * Keeps the screen on until released. The browser takes the lock away whenever the page is hidden, so it is asked for
 * again at each return. Where the browser has none or refuses (low battery), the screen goes off as usual.
 */
export function holdWakeLock(): () => void {
  let sentinel: WakeLockSentinel | null = null;
  let isWanted = true;
  const acquire = async (): Promise<void> => {
    if (!isWanted || !isVisible() || !('wakeLock' in navigator)) return;
    try {
      const lock = await navigator.wakeLock.request('screen');
      if (isWanted) sentinel = lock;
      else await lock.release();
    } catch (error) {
      // refused, e.g. to save the battery: logging works all the same
      if (!(error instanceof DOMException)) throw error;
    }
  };
  const stop = onVisibilityChange((visible) => {
    if (visible) void acquire();
  });
  void acquire();
  return () => {
    isWanted = false;
    stop();
    void sentinel?.release();
  };
}
