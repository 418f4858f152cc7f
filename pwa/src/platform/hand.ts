import { useSyncExternalStore } from 'react';

/** The hand that holds the phone: the left one mirrors rows and keys. Kept on this phone, for whoever uses it. */
export type Hand = 'right' | 'left';

const HAND_KEY = 'harkmoor.hand';
const listeners = new Set<() => void>();

export function currentHand(): Hand {
  try {
    return localStorage.getItem(HAND_KEY) === 'left' ? 'left' : 'right';
  } catch {
    return 'right'; // storage is refused: the setting is a convenience
  }
}

/** Returns false where the choice cannot be kept. */
export function setHand(hand: Hand): boolean {
  let isKept = true;
  try {
    localStorage.setItem(HAND_KEY, hand);
  } catch {
    isKept = false;
  }
  for (const listener of listeners) listener();
  return isKept;
}

export function useHand(): Hand {
  return useSyncExternalStore((listener) => {
    listeners.add(listener);
    return () => listeners.delete(listener);
  }, currentHand);
}
