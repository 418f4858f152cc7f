/** Runs an act when the device has nothing better to do, at the latest after `limitMs`. */
export function whenIdle(act: () => void, limitMs = 10_000): void {
  if ('requestIdleCallback' in window) window.requestIdleCallback(act, { timeout: limitMs });
  else setTimeout(act, Math.min(limitMs, 4000));
}
