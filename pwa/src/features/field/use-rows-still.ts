import { useCallback, useEffect, useRef, useState } from 'react';
import { ROWS_STILL_MS } from './tap-guard';

/** True for two seconds after each `touch`: rows must not move under a thumb that comes back. */
export function useRowsStill(): { areStill: boolean; touch: () => void } {
  const [areStill, setAreStill] = useState(false);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  const touch = useCallback(() => {
    clearTimeout(timer.current);
    setAreStill(true);
    timer.current = setTimeout(() => setAreStill(false), ROWS_STILL_MS);
  }, []);
  useEffect(() => () => clearTimeout(timer.current), []);
  return { areStill, touch };
}
