import { stampOf } from '@harkmoor/sync-model/merge/record-state';
import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import type {
  EvidenceInput,
  EvidenceReception,
  ReceptionFields,
} from '@harkmoor/sync-model/evidence/evidence-input';
import type { ItuRegion } from '@harkmoor/sync-model/radio/bands/region';
import type { RecordType } from '@harkmoor/sync-model/records/record-types';
import { Dexie } from 'dexie';
import type { HarkmoorDatabase } from '../../../store/database';
import { inClub } from '../../../store/dexie-store';
import type { ClubNames } from '../answers/counted-club';

/** Rows a transaction: a save that waits behind one waits for some milliseconds, not for the whole log. */
const CHUNK_ROWS = 2000;

/** What evidence needs to know of a club, as this device holds it: deleted targets, gear and sites too. */
export type ClubReading = { readonly input: EvidenceInput; readonly names: ClubNames };

/** Reads a club's records in chunks, each in a transaction of its own; a write in between is read the next time. */
export async function readClub(
  database: HarkmoorDatabase,
  clubId: string,
  region: ItuRegion,
): Promise<ClubReading> {
  const all = <T extends RecordType>(type: T) =>
    inClub(database, type, clubId).toArray() as unknown as Promise<StoredRecord<T>[]>;
  const [sites, setups, receivers, antennas, targets] = await Promise.all([
    all('site'),
    all('setup'),
    all('receiver'),
    all('antenna'),
    all('target'),
  ]);
  const [clockChecks, dialChecks, outings, members] = await Promise.all([
    all('clock-check'),
    all('dial-check'),
    all('outing'),
    all('member'),
  ]);
  return {
    input: {
      region,
      receptions: await readReceptions(database, clubId),
      sites: fieldsById(sites),
      setups: fieldsById(setups),
      receivers: fieldsById(receivers),
      targets: fieldsById(targets),
      clockChecks: clockChecks.map(({ fields }) => fields),
      dialChecks: dialChecks.map(({ fields }) => fields),
      outings: outings.map((outing) => ({
        fields: outing.fields,
        clockStepsStamp: stampOf(outing, 'clockSteps'),
      })),
    },
    names: {
      sites: mapped(sites, ({ fields }) => fields.name),
      receivers: mapped(receivers, ({ fields }) => fields.name),
      antennas: mapped(antennas, ({ fields, ownerId }) => ({
        name: fields.name,
        kind: fields.kind,
        ownerId,
      })),
      setups: mapped(setups, ({ fields, ownerId }) => ({
        ownerId,
        receiverId: fields.receiverId,
        antennaId: fields.antennaId,
      })),
      targets: mapped(targets, ({ fields }) => fields.name),
      people: mapped(members, ({ fields }) => fields.name),
    },
  };
}

async function readReceptions(database: HarkmoorDatabase, clubId: string): Promise<EvidenceReception[]> {
  const table = database.recordTable('reception');
  const receptions: EvidenceReception[] = [];
  let after: unknown = Dexie.minKey;
  for (;;) {
    const rows = await table
      .where('[clubId+id]')
      .between([clubId, after], [clubId, Dexie.maxKey], false, false)
      .limit(CHUNK_ROWS)
      .toArray();
    for (const row of rows) receptions.push(receptionOf(row as StoredRecord<'reception'>));
    const last = rows.at(-1);
    if (last === undefined || rows.length < CHUNK_ROWS) return receptions;
    after = last.id;
  }
}

/** Keeps what is counted: remarks and programme details of 100 000 receptions stay on the disk. */
function receptionOf(row: StoredRecord<'reception'>): EvidenceReception {
  const { fields } = row;
  const kept: ReceptionFields = {
    deleted: fields.deleted,
    siteId: fields.siteId,
    setupId: fields.setupId,
    targetId: fields.targetId,
    targetHz: fields.targetHz,
    outcome: fields.outcome,
    basis: fields.basis,
    identity: fields.identity,
    deviceAt: fields.deviceAt,
    durationS: fields.durationS,
    tuning: fields.tuning,
    attenuationDb: fields.attenuationDb,
    sinpo: fields.sinpo,
    meter: fields.meter,
    carried: fields.carried,
  };
  return { id: row.id, ownerId: row.ownerId, fields: kept, deviceAtStamp: stampOf(row, 'deviceAt') };
}

function fieldsById<T extends RecordType>(rows: readonly StoredRecord<T>[]) {
  return mapped(rows, ({ fields }) => fields);
}

function mapped<Row extends { readonly id: string }, V>(
  rows: readonly Row[],
  valueOf: (row: Row) => V,
): ReadonlyMap<string, V> {
  return new Map(rows.map((row) => [row.id, valueOf(row)]));
}
