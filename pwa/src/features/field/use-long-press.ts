import { useEffect, useRef, type MouseEvent, type PointerEvent } from 'react';

const LONG_PRESS_MS = 500;
const MOVE_LIMIT_PX = 12;
/** A browser sends the click of a release within this time. */
const CLICK_FOLLOWS_MS = 120;
const LONGEST_HOLD_MS = 5000;

/**
 * A tap and a long press on one button. Each is told the moment at which the finger came down, ms UTC of the
 * device. A press that moves is a scroll and neither.
 */
export function useLongPress(acts: { onTap: (atMs: number) => void; onLongPress: (atMs: number) => void }) {
  const press = useRef<{ atMs: number; x: number; y: number; isSpent: boolean } | null>(null);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  useEffect(() => () => clearTimeout(timer.current), []);
  const spend = (): void => {
    clearTimeout(timer.current);
    if (press.current) press.current.isSpent = true;
  };
  return {
    onPointerDown: ({ clientX: x, clientY: y, button }: PointerEvent) => {
      if (button > 0) return; // a right or middle mouse button
      const atMs = Date.now();
      press.current = { atMs, x, y, isSpent: false };
      clearTimeout(timer.current);
      timer.current = setTimeout(() => {
        spend();
        swallowClickOfRelease();
        acts.onLongPress(atMs);
      }, LONG_PRESS_MS);
    },
    onPointerMove: ({ clientX, clientY }: PointerEvent) => {
      const from = press.current;
      if (from && Math.hypot(clientX - from.x, clientY - from.y) > MOVE_LIMIT_PX) clearTimeout(timer.current);
    },
    onPointerUp: () => clearTimeout(timer.current),
    onPointerCancel: () => {
      spend();
      press.current = null;
    },
    onContextMenu: (event: MouseEvent) => event.preventDefault(),
    onClick: () => {
      const from = press.current;
      press.current = null;
      clearTimeout(timer.current);
      if (from?.isSpent) return;
      acts.onTap(from?.atMs ?? Date.now());
    },
  };
}

/**
 * What opened under the finger must not take the click of its release for a tap beside it. One click at most is
 * swallowed, and none a moment after the release, or where no release is ever told.
 */
function swallowClickOfRelease(): void {
  const releases = ['pointerup', 'pointercancel', 'touchend'] as const;
  let timer = setTimeout(stop, LONGEST_HOLD_MS);
  function swallow(event: Event): void {
    event.stopPropagation();
    event.preventDefault();
    stop();
  }
  function released(): void {
    clearTimeout(timer);
    timer = setTimeout(stop, CLICK_FOLLOWS_MS);
  }
  function stop(): void {
    clearTimeout(timer);
    window.removeEventListener('click', swallow, true);
    for (const release of releases) window.removeEventListener(release, released, true);
  }
  window.addEventListener('click', swallow, true);
  for (const release of releases) window.addEventListener(release, released, true);
}
