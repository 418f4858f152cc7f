import type { FieldsByType } from '@harkmoor/sync-model/records/schemas';
import { Dexie } from 'dexie';
import { readClubRecords } from '../../../store/club-records';
import type { OpenLog } from '../../../store/open-log';
import type { WriteStep } from '../../../store/log-writer';
import type { GearType } from './gear';

type GearFields<T extends GearType> = FieldsByType[T];

/** Makes a new piece of gear, or corrects one: past receptions follow a correction. Returns its id. */
export async function saveGear<T extends GearType>(
  log: OpenLog,
  type: T,
  id: string | null,
  fields: GearFields<T>,
): Promise<string> {
  if (id === null) return (await log.writer.create(type, fields)).id;
  await log.writer.edit(type, id, fields);
  return id;
}

/**
 * The thing itself has changed: a new record takes its place from now, the old one is retired with its evidence,
 * and every setup in use gets a successor with the new piece. All of it is one write. Returns the new id.
 */
export async function replaceGear<T extends 'receiver' | 'antenna'>(
  log: OpenLog,
  type: T,
  id: string,
  fields: GearFields<T>,
  nowMs: number,
): Promise<string> {
  const successor = log.writer.newId();
  const part = type === 'receiver' ? 'receiverId' : 'antennaId';
  const setups = (await readClubRecords(log, 'setup')).filter(
    (setup) => setup.fields[part] === id && setup.fields.retiredAt === null && isOwnSetup(log, setup.ownerId),
  );
  await log.writer.apply([
    {
      kind: 'create',
      type,
      id: successor,
      fields: { ...fields, replaces: id, retiredAt: null },
    } as WriteStep,
    { kind: 'edit', type, id, patch: { retiredAt: nowMs } } as WriteStep,
    ...setups.flatMap((setup): WriteStep[] => [
      { kind: 'create', type: 'setup', fields: { ...setup.fields, [part]: successor } },
      { kind: 'edit', type: 'setup', id: setup.id, patch: { retiredAt: nowMs } },
    ]),
  ]);
  return successor;
}

function isOwnSetup(log: OpenLog, ownerId: string | null): boolean {
  return ownerId === null || ownerId === log.account?.id;
}

/** Whether anything on this phone refers to the gear; such gear is retired, never deleted. */
export async function isReferredTo(log: OpenLog, type: GearType, id: string): Promise<boolean> {
  if (type === 'setup') return isSetupUsed(log, id);
  const part = type === 'receiver' ? 'receiverId' : 'antennaId';
  return (await readClubRecords(log, 'setup')).some((setup) => setup.fields[part] === id);
}

async function isSetupUsed(log: OpenLog, id: string): Promise<boolean> {
  const outings = await readClubRecords(log, 'outing');
  if (outings.some((outing) => outing.fields.setupIds.includes(id))) return true;
  const used = await log.database
    .recordTable('reception')
    .where('[clubId+id]')
    .between([log.clubId, Dexie.minKey], [log.clubId, Dexie.maxKey])
    .filter((row) => row.fields.setupId === id)
    .first();
  return used !== undefined;
}

/** Puts gear away: retired where anything refers to it, else deleted. */
export async function putAway(
  log: OpenLog,
  type: GearType,
  id: string,
  nowMs: number,
): Promise<'retired' | 'deleted'> {
  const isUsed = await isReferredTo(log, type, id);
  const patch = isUsed ? { retiredAt: nowMs } : { deleted: true };
  await log.writer.apply([{ kind: 'edit', type, id, patch } as WriteStep]);
  return isUsed ? 'retired' : 'deleted';
}

export async function takeBack(log: OpenLog, type: GearType, id: string): Promise<void> {
  await log.writer.apply([
    { kind: 'edit', type, id, patch: { retiredAt: null, deleted: false } } as WriteStep,
  ]);
}
