import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { sameValue } from '@harkmoor/sync-model/merge/canonical-json';
import { isLeftOut } from '@harkmoor/sync-model/merge/history-value';
import { stampOf } from '@harkmoor/sync-model/merge/record-state';
import type { Reception } from '@harkmoor/sync-model/records/reception';
import { FIELD_NAMES } from '@harkmoor/sync-model/records/field-names';
import { stampWallMs, type Stamp } from '@harkmoor/sync-model/stamp/stamp';

type Register = { readonly value: unknown; readonly stamp: Stamp };

/** One value of one field that another one replaced. */
export type Change = {
  readonly id: string;
  readonly field: string;
  readonly replaced: Register;
  readonly kept: Register;
  readonly byId: string;
  /** The writer had not seen the value that it met. */
  readonly clash: boolean;
};

/** The changes that this device holds: those that met, and own values that were overtaken before they were sent. */
export function heldChanges(
  record: StoredRecord<'reception'>,
  clashes: readonly StoredRecord<'history'>[],
): Change[] {
  const met = clashes.map(({ id, fields }): Change => {
    const { field, replaced, kept, byId, clash } = fields;
    return { id, field, byId, clash, replaced: register(replaced), kept: register(kept) };
  });
  const overtaken = (record.debt?.lost ?? []).map(({ field, value, stamp }): Change => ({
    id: `${field}/${stamp}`,
    field,
    replaced: { value, stamp },
    kept: { value: fieldOf(record, field), stamp: stampOf(record, field) },
    byId: record.ownerId ?? '',
    clash: true,
  }));
  return newestFirst([...met, ...overtaken]);
}

/** Both lists as one: what the server and this device both tell stands once. */
export function allChanges(held: readonly Change[], read: readonly Change[]): Change[] {
  const key = ({ field, replaced, kept }: Change): string => `${field}/${replaced.stamp}/${kept.stamp}`;
  const byKey = new Map(held.map((change) => [key(change), change]));
  for (const change of read) byKey.set(key(change), change);
  return newestFirst([...byKey.values()]);
}

/** When the two values met: the later of their stamps, ms UTC. */
export function changedAtMs({ replaced, kept }: Change): number {
  return Math.max(stampWallMs(replaced.stamp), stampWallMs(kept.stamp));
}

export type PutBack =
  | { readonly kind: 'patch'; readonly patch: Partial<Reception> }
  | {
      readonly kind: 'refused';
      readonly code: 'not-kept' | 'same' | 'no-such-field';
      readonly sentence: string;
    };

/** The edit that puts the replaced value back, or why there is none to make. */
export function putBackPatch(change: Change, record: StoredRecord<'reception'>): PutBack {
  const { field, replaced } = change;
  if (!FIELD_NAMES.reception.includes(field)) {
    return { kind: 'refused', code: 'no-such-field', sentence: 'This version does not know the field.' };
  }
  if (isLeftOut(replaced.value)) {
    return { kind: 'refused', code: 'not-kept', sentence: 'Too long to be kept: only its size is known.' };
  }
  if (sameValue(replaced.value, fieldOf(record, field))) {
    return { kind: 'refused', code: 'same', sentence: 'This is the value it has now.' };
  }
  return { kind: 'patch', patch: { [field]: replaced.value } };
}

function fieldOf(record: StoredRecord<'reception'>, field: string): unknown {
  return (record.fields as Readonly<Record<string, unknown>>)[field];
}

function register({ value, stamp }: { value?: unknown; stamp: string }): Register {
  return { value: value ?? null, stamp };
}

function newestFirst(changes: Change[]): Change[] {
  return changes.sort((a, b) => changedAtMs(b) - changedAtMs(a) || (a.id < b.id ? 1 : -1));
}
