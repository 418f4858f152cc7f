import type { Lock } from '@harkmoor/sync-model/device/ports';

/** One tab syncs a log at a time; the others hear `busy` and are told of the outcome by the channel. */
export function createTabLock(databaseName: string): Lock {
  return {
    exclusively: async (work) => {
      if (!('locks' in navigator)) return work();
      return navigator.locks.request(`harkmoor-sync-${databaseName}`, { ifAvailable: true }, async (lock) =>
        lock ? work() : ('busy' as const),
      );
    },
  };
}
