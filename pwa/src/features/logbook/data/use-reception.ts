import { stampOf } from '@harkmoor/sync-model/merge/record-state';
import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import type { RecordType } from '@harkmoor/sync-model/records/record-types';
import { useLiveQuery } from 'dexie-react-hooks';
import { useActiveLog } from '../../../store/active-log';
import { readClubRecords } from '../../../store/club-records';
import type { OpenLog } from '../../../store/open-log';
import type { HeldReception, NamesOfIds } from './held-reception';

/** No clock check or step further than this from an entry matters to it, and no outing is longer. */
const AROUND_MS = 72 * 3_600_000;

/** One reception with what is known of it, kept current; undefined while it is read, null where it is not here. */
export function useReception(id: string | undefined): HeldReception | null | undefined {
  const log = useActiveLog();
  return useLiveQuery(async () => (id === undefined ? null : readReception(log, id)), [log, id]);
}

export async function readReception(log: OpenLog, id: string): Promise<HeldReception | null> {
  const record = await oneOf(log, 'reception', id);
  // blanked after 30 days in the bin, a reception has no values left to show
  if (!record?.fields.tuning) return null;
  const { fields } = record;
  const ownId = log.account?.id ?? null;
  const isOwn = record.ownerId === ownId;
  const setup = (await oneOf(log, 'setup', fields.setupId))?.fields ?? null;
  const [site, siteFix, outing, target, receiver, antenna] = await Promise.all([
    oneOf(log, 'site', fields.siteId),
    isOwn ? oneOf(log, 'site-fix', fields.siteId, log.myLogId) : null,
    oneOf(log, 'outing', fields.outingId),
    oneOf(log, 'target', fields.targetId),
    oneOf(log, 'receiver', setup?.receiverId),
    oneOf(log, 'antenna', setup?.antennaId),
  ]);
  const [clockChecks, dialChecks, outingsAround, clashes, names] = await Promise.all([
    readClubRecords(log, 'clock-check'),
    readClubRecords(log, 'dial-check'),
    readOutingsAround(log, fields.deviceAt),
    readClashes(log, id),
    readNames(log),
  ]);
  return {
    record,
    region: log.card.ituRegion,
    clubId: log.clubId,
    ownId,
    isOwn,
    site: site?.fields ?? null,
    siteFix: siteFix && !siteFix.fields.deleted ? siteFix.fields : null,
    outing: outing?.fields ?? null,
    setup,
    receiver: receiver?.fields ?? null,
    antenna: antenna?.fields ?? null,
    target: target?.fields.schedule ? target.fields : null,
    clockChecks: clockChecks.map((check) => check.fields),
    dialChecks: dialChecks
      .map((check) => check.fields)
      .filter(({ receiverId }) => receiverId === setup?.receiverId),
    outingsAround,
    clashes,
    names,
  };
}

async function oneOf<T extends RecordType>(
  log: OpenLog,
  type: T,
  id: string | null | undefined,
  clubId = log.clubId,
): Promise<StoredRecord<T> | null> {
  if (!id) return null;
  return ((await log.database.recordTable(type).get([clubId, id])) as StoredRecord<T> | undefined) ?? null;
}

async function readOutingsAround(log: OpenLog, atMs: number): Promise<HeldReception['outingsAround']> {
  const outings = (await log.database
    .recordTable('outing')
    .where('[clubId+fields.startedAt]')
    .between([log.clubId, atMs - AROUND_MS], [log.clubId, atMs + AROUND_MS])
    .toArray()) as StoredRecord<'outing'>[];
  return outings.map((outing) => ({
    fields: outing.fields,
    clockStepsStamp: stampOf(outing, 'clockSteps'),
  }));
}

async function readClashes(log: OpenLog, id: string): Promise<StoredRecord<'history'>[]> {
  const rows = (await log.database
    .recordTable('history')
    .where('[clubId+fields.recordId]')
    .equals([log.clubId, id])
    .toArray()) as StoredRecord<'history'>[];
  return rows.filter(({ fields }) => !fields.deleted && fields.recordType === 'reception');
}

async function readNames(log: OpenLog): Promise<NamesOfIds> {
  const [members, sites, targets, setups, antennas] = await Promise.all([
    readClubRecords(log, 'member'),
    readClubRecords(log, 'site'),
    readClubRecords(log, 'target'),
    readClubRecords(log, 'setup'),
    readClubRecords(log, 'antenna'),
  ]);
  const named = (rows: readonly { id: string; fields: { name: string } }[]) =>
    new Map(rows.map((row) => [row.id, row.fields.name]));
  const antennaNames = named(antennas);
  const names = {
    member: named(members),
    site: named(sites),
    target: named(targets),
    setup: new Map(
      setups.map(({ id, fields }) => [id, antennaNames.get(fields.antennaId) ?? 'Unknown antenna']),
    ),
  };
  return (type, id) => names[type].get(id) ?? null;
}
