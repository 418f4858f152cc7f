import { sameValue } from '../merge/canonical-json.js';
import { mergeRecord } from '../merge/merge-record.js';
import { stampOf, type RecordState } from '../merge/record-state.js';
import { hasHistory } from '../merge/replaced-values.js';
import type { FeedRecord } from '../protocol/messages.js';
import { withEmptyFields } from '../records/field-names.js';
import { isWritableType } from '../records/record-types.js';
import type { Stamp } from '../stamp/stamp.js';
import {
  withDebt,
  withState,
  type Debt,
  type LostValue,
  type OwedField,
  type StoredRecord,
} from './stored-record.js';

/**
 * The record after the feed has brought `pulled`. What others own and this phone owes nothing of is replaced
 * whole; else the fields merge by stamp, and an unsent value that a later one replaces is kept as lost until
 * it has reached the history.
 */
export function withPulled(
  clubId: string,
  accountId: string,
  record: StoredRecord | undefined,
  pulled: FeedRecord,
): StoredRecord {
  const fresh = storedOf(clubId, pulled);
  if (!record || !isWritableType(pulled.type)) return fresh;
  if (!record.debt && pulled.ownerId !== accountId) return fresh;
  const { ownerId, seq } = fresh;
  const merged = withState({ ...record, ownerId, seq }, mergeRecord(record, fresh));
  return record.debt ? withDebt(merged, debtAfter(record, record.debt, fresh)) : merged;
}

function storedOf(clubId: string, pulled: FeedRecord): StoredRecord {
  const { type, id, ownerId, seq, at, stamps } = pulled;
  const fields = isWritableType(type) ? withEmptyFields(type, pulled.fields) : pulled.fields;
  return { clubId, type, id, ownerId, seq, at, fields, ...(stamps ? { stamps } : {}) };
}

function debtAfter(record: StoredRecord, debt: Debt, remote: RecordState): Debt {
  const fields: Record<string, OwedField> = {};
  const lost: LostValue[] = [...(debt.lost ?? [])];
  for (const [field, owed] of Object.entries(debt.fields)) {
    const ours = stampOf(record, field);
    const theirs = stampOf(remote, field);
    // Equal stamps settle a field: the server holds our value, though its answer never came.
    if (ours > theirs) fields[field] = owedOver(owed, theirs);
    else if (ours < theirs && isWorthKeeping(field, record.fields[field], remote.fields[field])) {
      lost.push({ field, value: record.fields[field], stamp: ours, base: owed.base });
    }
  }
  return { ...debt, fields, lost };
}

function owedOver(owed: OwedField, theirs: Stamp): OwedField {
  return owed.base === theirs ? owed : { base: owed.base, over: theirs };
}

function isWorthKeeping(field: string, ours: unknown, theirs: unknown): boolean {
  return hasHistory(field) && !sameValue(ours, theirs);
}
