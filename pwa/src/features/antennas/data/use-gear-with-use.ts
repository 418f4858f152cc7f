import { useLiveQuery } from 'dexie-react-hooks';
import { isNewId } from '../../../platform/paths';
import { useGear, type Gear, type GearType } from './gear';
import { isReferredTo } from './gear-writes';

/** The gear, and whether anything refers to the piece that is looked at; undefined until both are known. */
export function useGearWithUse(
  type: GearType,
  id: string | undefined,
): { gear: Gear; isUsed: boolean } | undefined {
  const gear = useGear();
  const isUsed = useLiveQuery(
    async () => (gear && id !== undefined && !isNewId(id) ? isReferredTo(gear.log, type, id) : false),
    [gear?.log, type, id],
  );
  return gear && isUsed !== undefined ? { gear, isUsed } : undefined;
}
