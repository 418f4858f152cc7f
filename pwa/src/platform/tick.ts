import { useSyncExternalStore } from 'react';
import { nowMs } from './clock';
import { isVisible, onVisibilityChange } from './visibility';

type Tick = { readonly subscribe: (listener: () => void) => () => void; readonly read: () => number };

/**
 * One shared timer for all who wait for the next full second or minute of a clock that is `aheadMs` before ours. It is
 * set to the boundary, rests while nobody looks, and costs one timer however many clocks stand on the screen.
 */
function createTick(periodMs: number, aheadMs = 0): Tick {
  const listeners = new Set<() => void>();
  let timer: ReturnType<typeof setTimeout> | undefined;
  let stopWatching: (() => void) | undefined;
  const timeMs = (): number => nowMs() - aheadMs;
  const flooredMs = (): number => Math.floor(timeMs() / periodMs) * periodMs;
  let shownMs = flooredMs();

  function beat(): void {
    clearTimeout(timer);
    shownMs = flooredMs();
    for (const listener of listeners) listener();
    if (isVisible() && listeners.size > 0) timer = setTimeout(beat, shownMs + periodMs - timeMs() + 1);
  }
  function read(): number {
    if (listeners.size === 0) shownMs = flooredMs();
    return shownMs;
  }
  function subscribe(listener: () => void): () => void {
    listeners.add(listener);
    if (listeners.size === 1) {
      stopWatching = onVisibilityChange((visible) => (visible ? beat() : clearTimeout(timer)));
      beat();
    }
    return () => {
      listeners.delete(listener);
      if (listeners.size > 0) return;
      clearTimeout(timer);
      stopWatching?.();
    };
  }
  return { subscribe, read };
}

const minute = createTick(60_000);
const seconds = new Map<number, Tick>();

/**
 * The time of the device less `aheadMs`, ms UTC, floored to the second; renders on each full second of that clock
 * while the screen is visible.
 */
export function useSecond(aheadMs = 0): number {
  const tick = seconds.get(aheadMs) ?? createTick(1000, aheadMs);
  seconds.set(aheadMs, tick);
  return useSyncExternalStore(tick.subscribe, tick.read);
}

/** The device's time, ms UTC, floored to the minute; renders once a minute while visible. */
export function useMinute(): number {
  return useSyncExternalStore(minute.subscribe, minute.read);
}
