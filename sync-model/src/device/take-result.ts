import { stampOf } from '../merge/record-state.js';
import type { ChangeResult } from '../protocol/messages.js';
import type { Stamp } from '../stamp/stamp.js';
import { owedAnew, type OwedChange } from './owed-change.js';
import { withDebt, type Debt, type OwedField, type StoredRecord } from './stored-record.js';

/**
 * The record after the server's answer to what was sent of it. Only what stands as it was sent is settled: a
 * field that was edited meanwhile stays owed, and a refusal or a hold of what no longer stands is passed over.
 */
export function withResult(
  record: StoredRecord,
  sent: OwedChange,
  result: ChangeResult,
  settings: { readonly accountId: string; readonly deviceNowMs: number },
): StoredRecord {
  if (!record.debt) return record;
  if (result.status === 'applied') return applied(record, record.debt, sent, result.seq);
  const isOwn = record.ownerId === null || record.ownerId === settings.accountId;
  if (result.status === 'refused' && result.code === 'whole-record-needed' && isOwn) {
    return owedAnew(record, settings.deviceNowMs);
  }
  if (!standsAsSent(record, record.debt, sent)) return record;
  const { since, fields, lost } = record.debt;
  const debt = { since, fields, ...(lost ? { lost } : {}) };
  if (result.status === 'held') return withDebt(record, { ...debt, status: 'held', needs: result.needs });
  const { code, message } = result;
  return withDebt(record, { ...debt, status: 'refused', code, message });
}

function applied(record: StoredRecord, debt: Debt, sent: OwedChange, seq: number): StoredRecord {
  const lost = (debt.lost ?? []).filter(({ field, stamp }) => sent.stamps[field] !== stamp);
  const sentLost = new Set((debt.lost ?? []).filter((one) => !lost.includes(one)).map(({ field }) => field));
  const fields: Record<string, OwedField> = {};
  for (const [field, owed] of Object.entries(debt.fields)) {
    const sentStamp = sentLost.has(field) ? undefined : sent.stamps[field];
    if (sentStamp !== stampOf(record, field)) fields[field] = rebased(owed, sentStamp);
  }
  return withDebt({ ...record, seq }, { since: debt.since, fields, lost, status: 'waiting' });
}

/** What was edited while it was being sent has replaced the value that the server now holds. */
function rebased(owed: OwedField, sentStamp: Stamp | undefined): OwedField {
  return sentStamp === undefined ? owed : { base: sentStamp, ...(owed.over ? { over: owed.over } : {}) };
}

/** False where anything was edited since, which may have mended the record: it goes again. */
function standsAsSent(record: StoredRecord, debt: Debt, sent: OwedChange): boolean {
  return Object.keys(debt.fields).every((field) => {
    const isLostSent = debt.lost?.some((lost) => lost.field === field && lost.stamp === sent.stamps[field]);
    return isLostSent === true || sent.stamps[field] === stampOf(record, field);
  });
}
