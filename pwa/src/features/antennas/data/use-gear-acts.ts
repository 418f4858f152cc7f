import type { FieldsByType } from '@harkmoor/sync-model/records/schemas';
import type { OpenLog } from '../../../store/open-log';
import type { GearType } from './gear';
import { putAway, replaceGear, saveGear, takeBack } from './gear-writes';

/** What a gear form does with the piece; `putAway` and `takeBack` only for one that exists. */
export function useGearActs<T extends GearType>(log: OpenLog, type: T, id: string | null) {
  return {
    save: async (how: 'correct' | 'replace', fields: FieldsByType[T]): Promise<boolean> => {
      if (how === 'replace' && id !== null && type !== 'setup') {
        await replaceGear(log, type as 'receiver' | 'antenna', id, fields as never, Date.now());
      } else {
        await saveGear(log, type, id, fields);
      }
      return true;
    },
    putAway: id === null ? undefined : () => putAway(log, type, id, Date.now()),
    takeBack: id === null ? undefined : () => takeBack(log, type, id),
  };
}
