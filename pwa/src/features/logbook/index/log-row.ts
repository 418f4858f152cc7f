import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { stampOf } from '@harkmoor/sync-model/merge/record-state';
import type { Reception } from '@harkmoor/sync-model/records/reception';
import { stampWallMs } from '@harkmoor/sync-model/stamp/stamp';
import { folded } from './search-text';

/** How far a reception is on its way to the server, as its own row tells; `sending` is known only while it runs. */
export type OwedState = 'none' | 'waiting' | 'refused';

/** What the list holds of a reception: enough to order, filter and search 100 000, and nothing else of them. */
export type LogRow = {
  readonly id: string;
  readonly ownerId: string | null;
  readonly outingId: string | null;
  readonly siteId: string;
  readonly setupId: string;
  readonly targetId: string | null;
  readonly targetHz: number | null;
  readonly stationName: string | null;
  readonly dialHz: number;
  /** Raw time of the device, ms UTC. */
  readonly deviceAt: number;
  readonly outcome: Reception['outcome'];
  readonly nilReason: Reception['nilReason'];
  readonly sinpo: Reception['sinpo'];
  readonly rst: Reception['rst'];
  readonly carried: Reception['carried'];
  /** Folded remarks, for the search alone. */
  readonly remarks: string;
  readonly owed: OwedState;
  /** When it was put into the bin, ms UTC by the stamp; null for what is not in it. */
  readonly binnedAt: number | null;
};

/** The row of a stored reception; null once its values were blanked after 30 days in the bin. */
export function logRow(record: StoredRecord<'reception'>): LogRow | null {
  const { id, ownerId, fields, debt } = record;
  if (!fields.tuning || !fields.siteId) return null;
  return {
    id,
    ownerId,
    outingId: fields.outingId,
    siteId: fields.siteId,
    setupId: fields.setupId,
    targetId: fields.targetId,
    targetHz: fields.targetHz,
    stationName: fields.stationName,
    dialHz: fields.tuning.dialHz,
    deviceAt: fields.deviceAt,
    outcome: fields.outcome,
    nilReason: fields.nilReason,
    sinpo: fields.sinpo,
    rst: fields.rst,
    carried: fields.carried,
    remarks: fields.remarks === null ? '' : folded(fields.remarks),
    owed: debt === undefined ? 'none' : debt.status === 'refused' ? 'refused' : 'waiting',
    binnedAt: fields.deleted ? stampWallMs(stampOf(record, 'deleted')) : null,
  };
}
