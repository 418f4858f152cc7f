import { useEffect, useRef } from 'react';

/**
 * Brings the next row into view: when the outing is opened, when a round begins, and once the rows may move again
 * after a tap.
 */
export function useNextRowInView(areRowsStill: boolean, roundNo: number): void {
  const wereStill = useRef(false);
  useEffect(() => showNextRow('auto'), [roundNo]);
  useEffect(() => {
    const isReleased = wereStill.current && !areRowsStill;
    wereStill.current = areRowsStill;
    if (isReleased) showNextRow('smooth');
  }, [areRowsStill]);
}

function showNextRow(wished: ScrollBehavior): void {
  const behavior = window.matchMedia('(prefers-reduced-motion: reduce)').matches ? 'auto' : wished;
  document.querySelector('.fd-row-next')?.scrollIntoView({ block: 'nearest', behavior });
}
