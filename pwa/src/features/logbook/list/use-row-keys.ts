import { useEffect, useRef, useState, type KeyboardEvent, type RefObject } from 'react';

const STEPS: Readonly<Record<string, number>> = {
  ArrowDown: 1,
  ArrowUp: -1,
  PageDown: 10,
  PageUp: -10,
  Home: -Infinity,
  End: Infinity,
};

/** What a row has to know of the keys; `isStop`: the one row that Tab comes to. */
export type RowStop = {
  readonly place: number;
  readonly isStop: boolean;
  readonly onReach: (place: number) => void;
};

/** What the link of a row carries, so that the keys find it. */
export function rowLink({ place, isStop, onReach }: RowStop) {
  return { 'data-place': place, tabIndex: isStop ? 0 : -1, onFocus: () => onReach(place) };
}

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
  return { active: place, onKeyDown, onReach: setActive };
}
