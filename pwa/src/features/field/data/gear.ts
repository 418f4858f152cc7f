import type { MeterScale } from '@harkmoor/sync-model/records/receiver';
import { useLiveQuery } from 'dexie-react-hooks';
import { useActiveLog } from '../../../store/active-log';
import { readClubRecords } from '../../../store/club-records';
import type { OpenLog } from '../../../store/open-log';
import { withLabels, type SetupNames } from '../setup-labels';

/** A setup as the screens name it. */
export type SetupChoice = SetupNames & {
  id: string;
  /** As short as tells it apart from those it is listed with. */
  label: string;
  meterScale: MeterScale;
  isOwn: boolean;
  /** May be taken along: one's own, or with a receiver and an antenna that their owners let others use. */
  isOffered: boolean;
  isRetired: boolean;
};

/** All setups of the club's log on this phone, own ones first, retired ones too: old entries still name them. */
export async function readGear(log: OpenLog): Promise<SetupChoice[]> {
  const [setups, antennas, receivers, members] = await Promise.all([
    readClubRecords(log, 'setup'),
    readClubRecords(log, 'antenna'),
    readClubRecords(log, 'receiver'),
    readClubRecords(log, 'member'),
  ]);
  const antennaById = new Map(antennas.map((antenna) => [antenna.id, antenna.fields]));
  const receiverById = new Map(receivers.map((receiver) => [receiver.id, receiver.fields]));
  const memberById = new Map(members.map((member) => [member.id, member.fields.name]));
  const ownId = log.account?.id ?? null;
  const choices = setups.flatMap(({ id, ownerId, fields }): SetupChoice[] => {
    const antenna = antennaById.get(fields.antennaId);
    const receiver = receiverById.get(fields.receiverId);
    if (!antenna || !receiver) return [];
    const isOwn = ownerId === ownId;
    return [
      {
        id,
        label: '',
        antennaName: fields.coupling ? `${antenna.name}, ${fields.coupling}` : antenna.name,
        receiverName: receiver.name,
        ownerName: ownerId === null ? '' : (memberById.get(ownerId) ?? 'former member'),
        meterScale: receiver.meterScale,
        isOwn,
        isOffered: fields.retiredAt === null && (isOwn || (antenna.sharedUse && receiver.sharedUse)),
        isRetired: fields.retiredAt !== null,
      },
    ];
  });
  return withLabels(choices.sort((a, b) => Number(b.isOwn) - Number(a.isOwn)));
}

/** Those of `ids` that this phone holds, in that order, with labels that tell just these apart. */
export function setupsOf(gear: readonly SetupChoice[], ids: readonly string[]): SetupChoice[] {
  return withLabels(ids.flatMap((id) => gear.find((setup) => setup.id === id) ?? []));
}

/** All setups of the club's log on this phone; undefined while they are read. */
export function useGear(): SetupChoice[] | undefined {
  const log = useActiveLog();
  return useLiveQuery(() => readGear(log), [log]);
}
