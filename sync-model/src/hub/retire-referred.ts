import { mergeRecord } from '../merge/merge-record.js';
import { stampOf } from '../merge/record-state.js';
import { replacedValues } from '../merge/replaced-values.js';
import { parentsOf, RETIRABLE_TYPES } from '../records/record-types.js';
import { nextStamp, SERVER_DEVICE_ID, type Stamp } from '../stamp/stamp.js';
import type { HubKey, HubRecord, HubWrite } from './ports.js';
import { keyText, type WorkingSet } from './working-set.js';

/**
 * Sites and gear that anything refers to are retired, never deleted: where this transaction deletes one, or
 * refers to one that was deleted, the server restores and retires it by an edit of its own with later stamps.
 */
export async function retireReferred(tx: HubWrite, set: WorkingSet, nowMs: number): Promise<void> {
  const deleted = deletedCandidates(set);
  if (deleted.length === 0) return;
  const referred = new Set((await tx.referredTo(deleted.map(({ type, id }) => ({ type, id })))).map(keyText));
  for (const parent of namedParents(set.changed())) referred.add(parent);
  for (const record of deleted) {
    if (referred.has(keyText(record))) retire(set, record, nowMs);
  }
}

/** Deleted sites and gear that were changed here, or that a change of this transaction names. */
function deletedCandidates(set: WorkingSet): HubRecord[] {
  const deleted = set
    .all()
    .filter(({ type, fields }) => fields.deleted === true && RETIRABLE_TYPES.includes(type));
  if (deleted.length === 0) return [];
  const changed = set.changed();
  const concerned = new Set([...changed.map(keyText), ...namedParents(changed)]);
  return deleted.filter((record) => concerned.has(keyText(record)));
}

function namedParents(records: readonly HubRecord[]): string[] {
  return records.flatMap((record) => parentsOf(record.type, record.fields).map(keyText));
}

function retire(set: WorkingSet, record: HubRecord, nowMs: number): void {
  const key: HubKey = { type: record.type, id: record.id };
  const fields: Record<string, unknown> = { deleted: false };
  if (typeof record.fields.retiredAt !== 'number') fields.retiredAt = nowMs;
  const base = baseOf(record, Object.keys(fields));
  const edit = { at: nextStamp(SERVER_DEVICE_ID, nowMs, Object.values(base)), fields };
  set.addRows(key, replacedValues(record, edit, base));
  set.merged(key, mergeRecord(record, edit), false);
}

function baseOf(record: HubRecord, fields: readonly string[]): Record<string, Stamp> {
  return Object.fromEntries(fields.map((field) => [field, stampOf(record, field)]));
}
