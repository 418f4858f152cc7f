import { useEffect, useMemo, useState } from 'react';
import type { Reception } from '@harkmoor/sync-model/records/reception';
import { useActiveLog } from '../../../store/active-log';
import { binEntry, saveEdit, saveNewEntry } from './entry-writer';
import { dropPadDraft, keepPadDraft, type PadValues } from './pad-drafts';
import { readPadStart, type PadAddress, type PadStart } from './pad-start';

/** What the pad starts from, read once for each address; null while it is read. */
export function usePadStart(address: PadAddress): PadStart | null {
  const log = useActiveLog();
  const [start, setStart] = useState<{ path: string; found: PadStart } | null>(null);
  useEffect(() => {
    let isWanted = true;
    readPadStart(log, address).then(
      (found) => isWanted && setStart({ path: address.path, found }),
      (error: unknown) => {
        console.error('The pad could not be opened', error);
        const found = {
          kind: 'gone',
          sentence: 'The log could not be read. Close other tabs and open this again.',
        } as const;
        if (isWanted) setStart({ path: address.path, found });
      },
    );
    return () => {
      isWanted = false;
    };
  }, [log, address]);
  return start?.path === address.path ? start.found : null;
}

/** What the pad writes: drafts while it is open, the entry when it is saved. */
export function usePadLog() {
  const log = useActiveLog();
  return useMemo(
    () => ({
      keepDraft: (values: PadValues) => keepPadDraft(log, values, Date.now()),
      dropDraft: (receptionId: string) => dropPadDraft(log, receptionId),
      save: (values: PadValues, fields: Reception) =>
        values.isEdit
          ? saveEdit(log, values.receptionId, fields, Date.now())
          : saveNewEntry(log, values.receptionId, fields),
      bin: async (values: PadValues) => {
        await binEntry(log, { id: values.receptionId, outingId: values.outingId }, Date.now());
        await dropPadDraft(log, values.receptionId);
      },
    }),
    [log],
  );
}
