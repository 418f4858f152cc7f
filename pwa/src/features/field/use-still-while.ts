import { useState } from 'react';

/** The newest value, but the one from before for as long as `isStill` is true. */
export function useStillWhile<T>(isStill: boolean, value: T): T {
  const [shown, setShown] = useState(value);
  // adjusting state while rendering is React's own way to follow a prop: no frame shows the old value
  if (!isStill && shown !== value) {
    setShown(value);
    return value;
  }
  return shown;
}
