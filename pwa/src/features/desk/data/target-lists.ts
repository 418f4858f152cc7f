import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { writeRefusal, type Write } from '@harkmoor/sync-model/access/write-refusal';
import type { Target } from '@harkmoor/sync-model/records/target';
import type { TargetList } from '@harkmoor/sync-model/records/target-list';
import { useLiveQuery } from 'dexie-react-hooks';
import { useActiveLog } from '../../../store/active-log';
import { readClubRecords } from '../../../store/club-records';
import type { WriteStep } from '../../../store/log-writer';
import type { OpenLog } from '../../../store/open-log';

export type ListRow = { readonly list: StoredRecord<'target-list'>; readonly targets: number };

/** The target lists of the shown club by name, with how many targets each has. */
export function useTargetLists(): ListRow[] | undefined {
  const log = useActiveLog();
  return useLiveQuery(async () => {
    const lists = await readClubRecords(log, 'target-list');
    const targets = await readClubRecords(log, 'target');
    return lists
      .map((list) => ({ list, targets: targets.filter((target) => target.fields.listId === list.id).length }))
      .sort((a, b) => a.list.fields.name.localeCompare(b.list.fields.name));
  }, [log]);
}

export type ListView = {
  readonly log: OpenLog;
  readonly list: StoredRecord<'target-list'>;
  readonly targets: readonly StoredRecord<'target'>[];
  readonly mayEdit: boolean;
  readonly mayPublish: boolean;
};

/** One list with its targets in order of frequency; null where this phone does not hold it. */
export function useTargetList(id: string | undefined): ListView | null | undefined {
  const log = useActiveLog();
  return useLiveQuery(async () => (id === undefined ? null : readList(log, id)), [log, id]);
}

async function readList(log: OpenLog, id: string): Promise<ListView | null> {
  const list = await log.database.recordTable('target-list').get([log.clubId, id]);
  if (!list || list.fields.deleted) return null;
  const targets = (await readClubRecords(log, 'target'))
    .filter((target) => target.fields.listId === id)
    .sort((a, b) => a.fields.frequencyHz - b.fields.frequencyHz);
  return {
    log,
    list,
    targets,
    mayEdit: refusalOf(log, list, {}) === null,
    mayPublish: refusalOf(log, list, { publishedAt: 0 }) === null,
  };
}

/** The same rule that the server asks, so that no form is offered that it would refuse. */
function refusalOf(log: OpenLog, list: StoredRecord<'target-list'>, changed: Write['changed']) {
  const accountId = log.account?.id ?? '';
  const ownerId = list.ownerId ?? accountId;
  const writer = { accountId, role: log.role, clubKind: log.card.kind };
  const { publishedAt } = list.fields;
  return writeRefusal(writer, { type: 'target-list', ownerId, changed, list: { ownerId, publishedAt } });
}

export type NewList = Pick<TargetList, 'name' | 'edition'>;

export function useListActs() {
  const { writer } = useActiveLog();
  return {
    make: async ({ name, edition }: NewList): Promise<string> => {
      const empty = { deleted: false, importId: null, validFrom: null, validTo: null, publishedAt: null };
      return (await writer.create('target-list', { ...empty, name, edition })).id;
    },
    rename: (id: string, patch: NewList) => writer.edit('target-list', id, patch),
    publish: (id: string, nowMs: number) => writer.edit('target-list', id, { publishedAt: nowMs }),
    remove: (view: ListView) =>
      writer.apply([
        ...view.targets.map((target): WriteStep => ({
          kind: 'edit',
          type: 'target',
          id: target.id,
          patch: { deleted: true },
        })),
        { kind: 'edit', type: 'target-list', id: view.list.id, patch: { deleted: true } },
      ]),
    saveTarget: async (id: string | null, target: Target): Promise<void> => {
      if (id === null) await writer.create('target', target);
      else await writer.edit('target', id, target);
    },
    removeTarget: (id: string) => writer.edit('target', id, { deleted: true }),
    /** All of a file's targets in one write, under one import id, or none. */
    importTargets: async (
      listId: string,
      targets: readonly Omit<Target, 'listId' | 'importId'>[],
    ): Promise<void> => {
      const importId = writer.newId();
      await writer.apply(
        targets.map((target): WriteStep => ({
          kind: 'create',
          type: 'target',
          fields: { ...target, listId, importId },
        })),
      );
    },
  };
}
