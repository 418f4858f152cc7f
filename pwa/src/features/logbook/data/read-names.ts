import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import type { RecordType } from '@harkmoor/sync-model/records/record-types';
import type { HarkmoorDatabase } from '../../../store/database';
import { inClub } from '../../../store/dexie-store';
import type { LogNames } from '../index/log-names';
import type { LogAddress } from './desk-messages';

/** The types whose change makes names be read again. */
export const NAME_TYPES: readonly RecordType[] = [
  'target',
  'site',
  'setup',
  'antenna',
  'member',
  'outing',
  'history',
];

/** Everything that gives the ids in receptions a name: few records beside the receptions themselves. */
export async function readNames(database: HarkmoorDatabase, address: LogAddress): Promise<LogNames> {
  const all = <T extends RecordType>(type: T) =>
    inClub(database, type, address.clubId).toArray() as unknown as Promise<StoredRecord<T>[]>;
  const [targets, sites, setups, antennas, members, outings, history] = await Promise.all([
    all('target'),
    all('site'),
    all('setup'),
    all('antenna'),
    all('member'),
    all('outing'),
    all('history'),
  ]);
  const antennaNames = mapped(antennas, ({ fields }) => fields.name);
  return {
    region: address.region,
    ownId: address.ownId,
    targets: mapped(targets, ({ fields }) => fields.name),
    sites: mapped(sites, ({ fields }) => fields.name),
    antennas: mapped(setups, ({ fields }) => ({
      antennaId: fields.antennaId,
      name: antennaNames.get(fields.antennaId) ?? 'Unknown antenna',
    })),
    people: mapped(members, ({ fields }) => fields.name),
    outings: mapped(outings, ({ fields }) => ({ startedAt: fields.startedAt, siteId: fields.siteId })),
    clashes: new Set(
      history
        .filter(({ fields }) => !fields.deleted && fields.clash && fields.recordType === 'reception')
        .map(({ fields }) => fields.recordId),
    ),
  };
}

function mapped<Row extends { readonly id: string }, V>(
  rows: readonly Row[],
  valueOf: (row: Row) => V,
): ReadonlyMap<string, V> {
  return new Map(rows.map((row) => [row.id, valueOf(row)]));
}
