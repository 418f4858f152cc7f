/** One short buzz: the tap was taken. Nothing where the device cannot, or the person wants less motion. */
export function buzz(durationMs = 12): void {
  if (window.matchMedia('(prefers-reduced-motion: reduce)').matches) return;
  if (typeof navigator.vibrate === 'function') navigator.vibrate(durationMs);
}
