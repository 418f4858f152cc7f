import { useMemo } from 'react';
import { pathBetween } from '@harkmoor/sync-model/radio/path/path';
import type { RunningField } from './use-running-field';
import { pathWords } from './words';

/** "862 km · 98°" for each target whose transmitter is known, from the owner's exact fix: this screen alone shows it. */
export function useRowPaths({ frame: { position, targets } }: RunningField): ReadonlyMap<string, string> {
  return useMemo(() => {
    const words = new Map<string, string>();
    if (position === null) return words;
    for (const { id, fields } of targets) {
      if (fields.tx) words.set(id, pathWords(pathBetween(position, fields.tx)));
    }
    return words;
  }, [position, targets]);
}
