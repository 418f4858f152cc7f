import type { FieldValue } from '../merge/record-state.js';
import type { FeedRecord } from '../protocol/messages.js';
import { formatStamp, SERVER_DEVICE_ID } from '../stamp/stamp.js';
import type { HistoryRow, HubRecord } from './ports.js';

/** A stored record as the feed carries it: empty fields left out, their stamps kept. */
export function feedRecordOf(record: HubRecord): FeedRecord {
  const { type, id, ownerId, seq, at, stamps } = record;
  const fields: Record<string, FieldValue> = {};
  for (const [field, value] of Object.entries(record.fields)) {
    if (value !== null && value !== undefined) fields[field] = value;
  }
  return { type, id, ownerId, seq, at, fields, ...(stamps ? { stamps: { ...stamps } } : {}) };
}

/** A history row as the feed carries it; only for rows with a `seq`. */
export function feedRecordOfHistory(row: HistoryRow): FeedRecord {
  if (row.seq === null) throw new Error('only history rows with a seq travel in the feed');
  const { id, recordType, recordId, field, replaced, kept, byId, clash } = row;
  return {
    type: 'history',
    id,
    ownerId: null,
    seq: row.seq,
    at: formatStamp({ wallMs: row.at, counter: 0, deviceId: SERVER_DEVICE_ID }),
    fields: { deleted: false, recordType, recordId, field, replaced, kept, byId, clash },
  };
}
