import type { HubSnapshot, HubStore, HubWrite } from '@harkmoor/sync-model/hub/ports';

/** Milliseconds spent in each kind of question to the store; `ends` is the beginning and the end of transactions. */
export type StoreTimes = Record<'read' | 'write' | 'history' | 'lock' | 'page' | 'ends', number>;

/** The same store with a clock beside each step; `history` is a save that holds history rows. */
export function timedStore(store: HubStore, times: StoreTimes): HubStore {
  const timed = async <T>(part: keyof StoreTimes, work: () => Promise<T>): Promise<T> => {
    const started = performance.now();
    try {
      return await work();
    } finally {
      times[part] += performance.now() - started;
    }
  };
  const timedWrite = (tx: HubWrite): HubWrite => ({
    memberRole: (accountId) => timed('lock', () => tx.memberRole(accountId)),
    lockClub: () => timed('lock', () => tx.lockClub()),
    records: (keys) => timed('read', () => tx.records(keys)),
    referredTo: (keys) => timed('read', () => tx.referredTo(keys)),
    replacedBefore: (values) => timed('read', () => tx.replacedBefore(values)),
    save: (records, history, seq) =>
      timed(history.length > 0 ? 'history' : 'write', () => tx.save(records, history, seq)),
  });
  const timedSnapshot = (snapshot: HubSnapshot): HubSnapshot => ({
    memberships: (accountId) => timed('page', () => snapshot.memberships(accountId)),
    page: (clubId, cursor, limit) => timed('page', () => snapshot.page(clubId, cursor, limit)),
  });
  const betweenEnds = async <T>(
    transaction: (work: <R>(inside: () => Promise<R>) => Promise<R>) => Promise<T>,
  ) => {
    const started = performance.now();
    let insideMs = 0;
    try {
      return await transaction(async (inside) => {
        const entered = performance.now();
        try {
          return await inside();
        } finally {
          insideMs += performance.now() - entered;
        }
      });
    } finally {
      times.ends += performance.now() - started - insideMs;
    }
  };
  return {
    write: (clubId, work) =>
      betweenEnds((within) => store.write(clubId, (tx) => within(() => work(timedWrite(tx))))),
    read: (work) =>
      betweenEnds((within) => store.read((snapshot) => within(() => work(timedSnapshot(snapshot))))),
  };
}
