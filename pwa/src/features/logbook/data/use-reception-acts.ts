import type { Reception } from '@harkmoor/sync-model/records/reception';
import { useMemo } from 'react';
import { useActiveLog } from '../../../store/active-log';

/** What the owner does to a reception; each is durable when it resolves. */
export type ReceptionActs = {
  bin(): Promise<void>;
  restore(): Promise<void>;
  /** An ordinary edit of the fields named. */
  putBack(patch: Partial<Reception>): Promise<void>;
};

export function useReceptionActs(id: string): ReceptionActs {
  const { writer, clubId } = useActiveLog();
  return useMemo(() => {
    const edit = async (patch: Partial<Reception>): Promise<void> => {
      await writer.edit('reception', id, patch, { clubId });
    };
    return {
      bin: () => edit({ deleted: true }),
      restore: () => edit({ deleted: false }),
      putBack: edit,
    };
  }, [writer, clubId, id]);
}
