import type { OutingStart } from '@harkmoor/sync-model/records/outing-from-start';
import { setupsOf, useGear, type SetupChoice } from './data/gear';
import type { StoredOuting } from './data/running-outing';
import { useSites, type SiteOption } from './data/sites';
import { useTargetLists, type ListOption } from './data/target-lists';
import { withLabels } from './setup-labels';

/** What the person changed of the last outing's choice. */
export type StartWishes = {
  siteId?: string;
  setupIds?: readonly string[];
  currentSetupId?: string;
  targetListId?: string | null;
};

export type StartChoice = {
  sites: SiteOption[];
  setups: { offered: SetupChoice[]; taken: SetupChoice[]; current: SetupChoice | null };
  lists: ListOption[];
  site: SiteOption | null;
  list: ListOption | null;
  /** Null while a site or a setup is missing. */
  start: OutingStart | null;
};

/** The next outing as the last one was, but for the wishes; what has been retired since falls out. Null while it is read. */
export function useStartChoice(newest: StoredOuting | null, wishes: StartWishes): StartChoice | null {
  const sites = useSites();
  const gear = useGear();
  const lists = useTargetLists();
  if (!sites || !gear || !lists) return null;
  const last = newest?.fields;
  const offered = withLabels(gear.filter(({ isOffered }) => isOffered));
  const site = byId(sites, wishes.siteId ?? last?.siteId) ?? (sites.length === 1 ? sites[0]! : null);
  const taken = takenSetups(offered, wishes.setupIds ?? last?.setupIds ?? []);
  const current = byId(taken, wishes.currentSetupId ?? last?.currentSetupId) ?? taken[0] ?? null;
  const listId = wishes.targetListId === undefined ? last?.targetListId : wishes.targetListId;
  const list = byId(lists, listId ?? undefined);
  const start: OutingStart | null =
    site && current
      ? {
          siteId: site.id,
          setupIds: taken.map(({ id }) => id),
          currentSetupId: current.id,
          targetListId: list?.id ?? null,
        }
      : null;
  return { sites, setups: { offered, taken, current }, lists, site, list, start };
}

/** Those asked for; where none of them is left, the one that there is. */
function takenSetups(offered: readonly SetupChoice[], ids: readonly string[]): SetupChoice[] {
  const taken = setupsOf(offered, ids);
  if (taken.length > 0 || ids.length > 0) return taken;
  const own = offered.filter(({ isOwn }) => isOwn);
  return withLabels((own.length > 0 ? own : offered).slice(0, 1));
}

function byId<T extends { id: string }>(items: readonly T[], id: string | undefined): T | null {
  return items.find((item) => item.id === id) ?? null;
}
