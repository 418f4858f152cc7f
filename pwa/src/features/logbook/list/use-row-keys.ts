import { useEffect, useRef, useState, type KeyboardEvent, type RefObject } from 'react';

const STEPS: Readonly<Record<string, number>> = {
  ArrowDown: 1,
  ArrowUp: -1,
  PageDown: 10,
  PageUp: -10,
  Home: -Infinity,
  End: Infinity,
};

type RowKeysProps = {
  readonly scroller: RefObject<HTMLElement | null>;
  readonly rowCount: number;
  readonly scrollToPlace: (place: number) => void;
};

/**
 * Arrow, page, Home and End keys walk the rows; Tab leaves the list again after one stop. The row that the keys
 * come to may not be drawn yet: it gets the focus as soon as it is.
 */
export function useRowKeys({ scroller, rowCount, scrollToPlace }: RowKeysProps) {
  const [active, setActive] = useState(0);
  const wanted = useRef<number | null>(null);
  const place = Math.min(active, Math.max(0, rowCount - 1));
  useEffect(() => {
    if (wanted.current === null) return;
    const link = scroller.current?.querySelector<HTMLElement>(`[data-place="${wanted.current}"]`);
    if (!link) return;
    wanted.current = null;
    link.focus({ preventScroll: true });
  });
  const onKeyDown = (event: KeyboardEvent): void => {
    const step = STEPS[event.key];
    if (step === undefined || !(event.target instanceof HTMLElement)) return;
    const from = event.target.closest<HTMLElement>('[data-place]')?.dataset.place;
    if (from === undefined) return;
    event.preventDefault();
    const next = Math.min(rowCount - 1, Math.max(0, Number(from) + step));
    wanted.current = next;
    setActive(next);
    scrollToPlace(next);
  };
  /** What each row's link carries; `isStop`: the one that Tab comes to. */
  const rowProps = (at: number, isStop: boolean) => ({
    'data-place': at,
    tabIndex: isStop ? 0 : -1,
    onFocus: () => setActive(at),
  });
  return { active: place, onKeyDown, rowProps };
}
