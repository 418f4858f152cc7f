import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { useLiveQuery } from 'dexie-react-hooks';
import { useActiveLog } from '../../../store/active-log';
import { readClubRecords } from '../../../store/club-records';
import type { OpenLog } from '../../../store/open-log';

export type GearType = 'receiver' | 'antenna' | 'setup';

export type SetupRow = {
  readonly setup: StoredRecord<'setup'>;
  readonly receiver: StoredRecord<'receiver'> | undefined;
  readonly antenna: StoredRecord<'antenna'> | undefined;
};

export type Gear = {
  readonly log: OpenLog;
  readonly receivers: readonly StoredRecord<'receiver'>[];
  readonly antennas: readonly StoredRecord<'antenna'>[];
  readonly setups: readonly SetupRow[];
  /** Names of members by account, for gear that others own. */
  readonly ownerNames: ReadonlyMap<string, string>;
};

/** All gear of the shown club, retired gear too; undefined while it is first read. */
export function useGear(): Gear | undefined {
  const log = useActiveLog();
  return useLiveQuery(() => readGear(log), [log]);
}

async function readGear(log: OpenLog): Promise<Gear> {
  const receivers = byName(await readClubRecords(log, 'receiver'));
  const antennas = byName(await readClubRecords(log, 'antenna'));
  const setups = await readClubRecords(log, 'setup');
  const members = await readClubRecords(log, 'member');
  const receiverById = new Map(receivers.map((row) => [row.id, row]));
  const antennaById = new Map(antennas.map((row) => [row.id, row]));
  return {
    log,
    receivers,
    antennas,
    setups: setups.map((setup) => ({
      setup,
      receiver: receiverById.get(setup.fields.receiverId),
      antenna: antennaById.get(setup.fields.antennaId),
    })),
    ownerNames: new Map(members.map((member) => [member.id, member.fields.name])),
  };
}

function byName<T extends { fields: { name: string } }>(rows: readonly T[]): T[] {
  return [...rows].sort((a, b) => a.fields.name.localeCompare(b.fields.name));
}

/** True where the person may change it: their own, or made here before there was an account. */
export function isOwn(log: OpenLog, record: { ownerId: string | null }): boolean {
  return record.ownerId === null || record.ownerId === log.account?.id;
}
