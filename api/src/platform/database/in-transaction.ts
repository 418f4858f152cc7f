import type { EntityManager } from '@mikro-orm/postgresql';

/** One transaction around work that only persists and never waits. */
export function inTransaction<T>(em: EntityManager, work: (tx: EntityManager) => T): Promise<T> {
  return em.transactional((tx) => Promise.resolve(work(tx)));
}
