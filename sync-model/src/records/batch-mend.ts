import type { Reception } from './reception.js';

type Entry = { id: string; fields: Pick<Reception, 'deviceAt' | 'setupId' | 'deleted' | 'swap'> };

/** What one *Change for entries since…* changed, enough to take exactly that back. */
export type SetupMend = { setupId: string; replaced: { id: string; setupId: string }[] };

/**
 * The entries since an instant (device clock, ms) that name another setup. Entries of a swap test stay: their
 * setup is the arm that the test's own order gave them.
 */
export function setupMend(entries: readonly Entry[], sinceMs: number, setupId: string): SetupMend {
  const replaced = entries
    .filter(({ fields }) => !fields.deleted && fields.swap === null && fields.deviceAt >= sinceMs)
    .filter(({ fields }) => fields.setupId !== setupId)
    .map(({ id, fields }) => ({ id, setupId: fields.setupId }));
  return { setupId, replaced };
}

/** What undoing a mend still may change: entries that were edited again since are left as they are. */
export function mendToUndo(mend: SetupMend, entries: readonly Entry[]): SetupMend['replaced'] {
  const bySetup = new Map(entries.map((entry) => [entry.id, entry.fields.setupId]));
  return mend.replaced.filter(({ id }) => bySetup.get(id) === mend.setupId);
}
