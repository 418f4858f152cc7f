import type { MeterScale } from '@harkmoor/sync-model/records/receiver';
import type { Antenna } from '@harkmoor/sync-model/records/antenna';
import { useLiveQuery } from 'dexie-react-hooks';
import { useActiveLog } from '../../../store/active-log';
import { readClubRecords } from '../../../store/club-records';
import type { OpenLog } from '../../../store/open-log';

/** A setup as the screens name it. */
export type SetupChoice = {
  id: string;
  /** The antenna's name; with the receiver's where two setups would read alike. */
  label: string;
  antennaName: string;
  antennaKind: Antenna['kind'];
  receiverName: string;
  meterScale: MeterScale;
  isOwn: boolean;
  isRetired: boolean;
};

/** All setups of the club's log on this phone, retired ones too: old entries still name them. */
export async function readGear(log: OpenLog): Promise<SetupChoice[]> {
  const [setups, antennas, receivers] = await Promise.all([
    readClubRecords(log, 'setup'),
    readClubRecords(log, 'antenna'),
    readClubRecords(log, 'receiver'),
  ]);
  const antennaById = new Map(antennas.map((antenna) => [antenna.id, antenna.fields]));
  const receiverById = new Map(receivers.map((receiver) => [receiver.id, receiver.fields]));
  const ownId = log.account?.id ?? null;
  const choices = setups.flatMap(({ id, ownerId, fields }): SetupChoice[] => {
    const antenna = antennaById.get(fields.antennaId);
    const receiver = receiverById.get(fields.receiverId);
    if (!antenna || !receiver) return [];
    return [
      {
        id,
        label: fields.coupling ? `${antenna.name}, ${fields.coupling}` : antenna.name,
        antennaName: antenna.name,
        antennaKind: antenna.kind,
        receiverName: receiver.name,
        meterScale: receiver.meterScale,
        isOwn: ownerId === ownId,
        isRetired: fields.retiredAt !== null,
      },
    ];
  });
  return choices.map((choice) => {
    const isAlone = choices.filter(({ label }) => label === choice.label).length === 1;
    return isAlone ? choice : { ...choice, label: `${choice.label} · ${choice.receiverName}` };
  });
}

/** The setups that may be taken along: own ones and those that are shared, none retired. */
export function useGear(): SetupChoice[] | undefined {
  const log = useActiveLog();
  return useLiveQuery(() => readGear(log), [log]);
}
