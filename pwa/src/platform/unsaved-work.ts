import { useEffect } from 'react';

const held = new Set<symbol>();
const listeners = new Set<() => void>();

/**
 * Says that something typed is not saved yet: an update waits for it and the browser asks before the page is left.
 * Returns how to release it.
 */
export function registerUnsavedWork(): () => void {
  const mark = Symbol('unsaved');
  if (held.size === 0) window.addEventListener('beforeunload', askBeforeLeaving);
  held.add(mark);
  return () => {
    if (!held.delete(mark) || held.size > 0) return;
    window.removeEventListener('beforeunload', askBeforeLeaving);
    for (const listener of listeners) listener();
  };
}

export function anyUnsavedWork(): boolean {
  return held.size > 0;
}

/** Called each time when the last unsaved work is saved or given up. Returns how to stop. */
export function onAllSaved(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

/** Marks a form as unsaved for as long as `isDirty` is true. */
export function useUnsavedWork(isDirty: boolean): void {
  useEffect(() => (isDirty ? registerUnsavedWork() : undefined), [isDirty]);
}

function askBeforeLeaving(event: BeforeUnloadEvent): void {
  event.preventDefault();
}
