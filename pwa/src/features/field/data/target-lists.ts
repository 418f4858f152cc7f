import { useLiveQuery } from 'dexie-react-hooks';
import { useActiveLog } from '../../../store/active-log';
import { readClubRecords } from '../../../store/club-records';

export type ListOption = { id: string; name: string; edition: string | null; targetCount: number };

/** The lists on this phone with the number of their targets, by name. Undefined while they are read. */
export function useTargetLists(): ListOption[] | undefined {
  const log = useActiveLog();
  return useLiveQuery(async () => {
    const lists = await readClubRecords(log, 'target-list');
    const counted = lists.map(async ({ id, fields }): Promise<ListOption> => {
      const targets = log.database
        .recordTable('target')
        .where('[clubId+fields.listId]')
        .equals([log.clubId, id]);
      const targetCount = await targets.filter((target) => !target.fields.deleted).count();
      return { id, name: fields.name, edition: fields.edition, targetCount };
    });
    return (await Promise.all(counted)).sort((a, b) => (a.name < b.name ? -1 : 1));
  }, [log]);
}
