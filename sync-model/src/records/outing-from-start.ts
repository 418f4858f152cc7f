import type { Outing } from './outing.js';

export type OutingStart = {
  siteId: string;
  setupIds: readonly string[];
  currentSetupId: string;
  targetListId: string | null;
  eventId?: string | null;
};

/** At most six setups go with one outing (records.md). */
export const SETUPS_PER_OUTING_MAX = 6;

/** A new running outing. Throws where the current setup is not among those taken along. */
export function outingFromStart(start: OutingStart, startedAtMs: number): Outing {
  const setupIds = [...new Set(start.setupIds)].slice(0, SETUPS_PER_OUTING_MAX);
  if (!setupIds.includes(start.currentSetupId)) throw new Error('the current setup must go with the outing');
  return {
    deleted: false,
    importId: null,
    siteId: start.siteId,
    startedAt: startedAtMs,
    ended: null,
    targetListId: start.targetListId,
    setupIds,
    currentSetupId: start.currentSetupId,
    eventId: start.eventId ?? null,
    clockSteps: [],
    notes: null,
  };
}
