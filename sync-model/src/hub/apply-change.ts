import { writeRefusal, type Writer } from '../access/write-refusal.js';
import { sameValue } from '../merge/canonical-json.js';
import { mergeRecord } from '../merge/merge-record.js';
import { stampOf, type RecordState } from '../merge/record-state.js';
import { replacedValues } from '../merge/replaced-values.js';
import type { Refusal } from '../protocol/messages.js';
import { parentsOf } from '../records/record-types.js';
import type { CheckedChange } from './check-change.js';
import type { HubKey, HubRecord } from './ports.js';
import type { WorkingSet } from './working-set.js';

export type ChangeOutcome =
  | { readonly status: 'applied' }
  | { readonly status: 'held'; readonly needs: string }
  | ({ readonly status: 'refused' } & Refusal);

const APPLIED: ChangeOutcome = { status: 'applied' };

/**
 * Merges one change into the working set, or says why not. A repeat changes nothing and is `applied`. Every
 * record that the change touches or names must have been read.
 */
export function applyChange(set: WorkingSet, writer: Writer, change: CheckedChange): ChangeOutcome {
  const stored = set.record(change.key);
  return stored ? changeStored(set, writer, change, stored) : makeNew(set, writer, change);
}

function makeNew(set: WorkingSet, writer: Writer, { key, state, base }: CheckedChange): ChangeOutcome {
  if (base) {
    return refused({ code: 'whole-record-needed', message: 'The server does not hold this record yet.' });
  }
  const refusal = accessRefusal(set, writer, key, null, state.fields);
  if (refusal) return refused(refusal);
  const needs = unknownParent(set, key, state.fields);
  if (needs !== null) return { status: 'held', needs };
  // one stamp for all fields is the form that a merge gives already; of several, the earliest becomes `at`
  const { at, fields } = state;
  const merged = state.stamps ? mergeRecord(state, state) : { at, fields };
  set.put({ ...key, ownerId: writer.accountId, seq: 0, ...merged }, true);
  return APPLIED;
}

function changeStored(
  set: WorkingSet,
  writer: Writer,
  { key, state, base }: CheckedChange,
  stored: HubRecord,
): ChangeOutcome {
  const news = newsOf(set, key, stored, state);
  if (!news) {
    if (!holdsAll(stored, state)) set.markDifferent(key);
    return APPLIED;
  }
  const refusal = accessRefusal(set, writer, key, stored, news.fields);
  if (refusal) return refused(refusal);
  const needs = unknownParent(set, key, news.fields);
  if (needs !== null) return { status: 'held', needs };
  const merged = mergeRecord(stored, news);
  set.addRows(key, replacedValues(stored, news, base));
  if (isUnchanged(stored, merged, Object.keys(news.fields))) set.markDifferent(key);
  else set.merged(key, merged, holdsAll(merged, state));
  return APPLIED;
}

/** The part of a change that the server has not seen: neither as the value it holds nor as one it replaced. */
function newsOf(set: WorkingSet, key: HubKey, stored: RecordState, change: RecordState): RecordState | null {
  const fields: Record<string, unknown> = {};
  const stamps: Record<string, string> = {};
  for (const [field, value] of Object.entries(change.fields)) {
    const stamp = stampOf(change, field);
    const isHeld =
      field in stored.fields && stamp === stampOf(stored, field) && sameValue(value, stored.fields[field]);
    if (isHeld || set.wasReplaced({ ...key, field, stamp })) continue;
    fields[field] = value;
    stamps[field] = stamp;
  }
  return Object.keys(fields).length > 0 ? { at: change.at, fields, stamps } : null;
}

function holdsAll(record: RecordState, change: RecordState): boolean {
  return Object.keys(change.fields).every((field) => stampOf(record, field) === stampOf(change, field));
}

/** Whether a merge left the fields that it could touch as they were. */
function isUnchanged(stored: RecordState, merged: RecordState, fields: readonly string[]): boolean {
  return fields.every(
    (field) =>
      field in stored.fields &&
      stampOf(merged, field) === stampOf(stored, field) &&
      sameValue(merged.fields[field], stored.fields[field]),
  );
}

/** The writer's rights; a target that moves between lists needs those of both. */
function accessRefusal(
  set: WorkingSet,
  writer: Writer,
  key: HubKey,
  stored: HubRecord | null,
  changed: Readonly<Record<string, unknown>>,
): Refusal | null {
  const write = { type: key.type, ownerId: stored?.ownerId ?? null, changed };
  const lists = listsOf(key, stored, changed).flatMap((list) => set.record(list) ?? []);
  if (lists.length === 0) return writeRefusal(writer, write);
  for (const { ownerId, fields } of lists) {
    const publishedAt = typeof fields.publishedAt === 'number' ? fields.publishedAt : null;
    const refusal = writeRefusal(writer, { ...write, list: { ownerId, publishedAt } });
    if (refusal) return refusal;
  }
  return null;
}

function listsOf(
  key: HubKey,
  stored: HubRecord | null,
  changed: Readonly<Record<string, unknown>>,
): HubKey[] {
  if (key.type === 'target-list') return stored ? [key] : [];
  if (key.type !== 'target') return [];
  const ids = [stored?.fields.listId, changed.listId].filter((id): id is string => typeof id === 'string');
  return ids.map((id) => ({ type: 'target-list', id }));
}

function unknownParent(
  set: WorkingSet,
  key: HubKey,
  fields: Readonly<Record<string, unknown>>,
): string | null {
  const missing = parentsOf(key.type, fields).find((parent) => !set.record(parent));
  return missing?.id ?? null;
}

function refused(refusal: Refusal): ChangeOutcome {
  return { status: 'refused', ...refusal };
}
