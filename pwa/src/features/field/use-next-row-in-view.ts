import { useEffect, useRef } from 'react';

/** Once the rows may move again after a tap, the next one comes into view. */
export function useNextRowInView(areRowsStill: boolean): void {
  const wereStill = useRef(false);
  useEffect(() => {
    const isReleased = wereStill.current && !areRowsStill;
    wereStill.current = areRowsStill;
    if (!isReleased) return;
    const behavior = window.matchMedia('(prefers-reduced-motion: reduce)').matches ? 'auto' : 'smooth';
    document.querySelector('.fd-row-next')?.scrollIntoView({ block: 'nearest', behavior });
  }, [areRowsStill]);
}
