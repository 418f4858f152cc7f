import { useEffect, useRef, useState, type KeyboardEvent } from 'react';
import { createPortal } from 'react-dom';
import './rain-lock.css';

const HOLD_MS = 2000;
const LOCK_KEY = 'harkmoor.rain-lock';

/** Whether the screen is locked against rain; a reload keeps it locked. */
export function useRainLock(): { isLocked: boolean; lock: () => void; unlock: () => void } {
  const [isLocked, setIsLocked] = useState(() => sessionStorage.getItem(LOCK_KEY) === '1');
  const change = (locked: boolean): void => {
    if (locked) sessionStorage.setItem(LOCK_KEY, '1');
    else sessionStorage.removeItem(LOCK_KEY);
    setIsLocked(locked);
  };
  return { isLocked, lock: () => change(true), unlock: () => change(false) };
}

/**
 * Takes every touch of the screen but a hold of two seconds, by finger or by the space or enter key. It is a modal
 * dialog, so that tabs, sheets and keys below rest as well, while clock and rows stay in sight.
 */
export function RainLock({ onOpen }: { readonly onOpen: () => void }) {
  const dialog = useRef<HTMLDialogElement>(null);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  const [isHeld, setIsHeld] = useState(false);
  useEffect(() => {
    const element = dialog.current;
    if (element && !element.open) element.showModal();
    // a browser may close a dialog at a second Escape, whatever it is told: then it opens again
    const reopen = (): void => element?.showModal();
    element?.addEventListener('close', reopen);
    return () => {
      clearTimeout(timer.current);
      element?.removeEventListener('close', reopen);
      element?.close();
    };
  }, []);
  const hold = (): void => {
    clearTimeout(timer.current);
    setIsHeld(true);
    timer.current = setTimeout(onOpen, HOLD_MS);
  };
  const letGo = (): void => {
    clearTimeout(timer.current);
    setIsHeld(false);
  };
  const isHoldKey = ({ key }: KeyboardEvent): boolean => key === ' ' || key === 'Enter';
  return createPortal(
    <dialog
      ref={dialog}
      className="fd-rain"
      aria-label="Locked against rain"
      onCancel={(event) => event.preventDefault()}
    >
      <button
        type="button"
        className={isHeld ? 'fd-rain-key fd-rain-held' : 'fd-rain-key'}
        onPointerDown={hold}
        onPointerUp={letGo}
        onPointerLeave={letGo}
        onPointerCancel={letGo}
        onContextMenu={(event) => event.preventDefault()}
        onKeyDown={(event) => {
          if (!isHoldKey(event)) return;
          event.preventDefault();
          if (!event.repeat) hold();
        }}
        onKeyUp={letGo}
        onBlur={letGo}
      >
        <b>Locked against rain</b>
        <span>Hold for two seconds to open</span>
      </button>
    </dialog>,
    document.body,
  );
}
