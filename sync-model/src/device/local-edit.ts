import { sameValue } from '../merge/canonical-json.js';
import { fromRegisters, stampOf } from '../merge/record-state.js';
import type { FieldsByType } from '../records/schemas.js';
import type { WritableType } from '../records/record-types.js';
import type { Stamp } from '../stamp/stamp.js';
import { withState, type OwedField, type StoredRecord } from './stored-record.js';

type Stamper = (replaced?: readonly (Stamp | undefined)[]) => Stamp;

/** Makes the stored form of a record that this phone has just made, with the debt of telling all its fields. */
export function newRecord<T extends WritableType>(
  made: {
    clubId: string;
    type: T;
    id: string;
    ownerId: string | null;
    fields: FieldsByType[T];
    deviceNowMs: number;
  },
  stamper: Stamper,
): StoredRecord<T> {
  const { clubId, type, id, ownerId, fields, deviceNowMs } = made;
  const owed: Record<string, OwedField> = {};
  for (const field of Object.keys(fields)) owed[field] = { base: null };
  const record: StoredRecord = {
    clubId,
    type,
    id,
    ownerId,
    seq: 0,
    at: stamper(),
    fields: fields as Readonly<Record<string, unknown>>,
    debt: { since: deviceNowMs, fields: owed, status: 'waiting' },
  };
  return record as StoredRecord<T>;
}

/**
 * Applies a person's edit. Fields whose value does not change are left alone; each changed field gets a stamp
 * after the value it replaces and joins the debt. An edit of a refused record makes it wait to be sent again.
 */
export function editedRecord<T extends WritableType>(
  record: StoredRecord<T>,
  patch: Partial<FieldsByType[T]>,
  deviceNowMs: number,
  stamper: Stamper,
): StoredRecord<T> {
  const current = record as StoredRecord;
  const changed = Object.keys(patch).filter(
    (field) => !sameValue((patch as Record<string, unknown>)[field], current.fields[field]),
  );
  if (changed.length === 0) return record;
  const stamp = stamper(changed.map((field) => stampOf(current, field)));
  const registers: Record<string, { value: unknown; stamp: Stamp }> = {};
  for (const field of Object.keys(current.fields)) {
    registers[field] = { value: current.fields[field], stamp: stampOf(current, field) };
  }
  const owed: Record<string, OwedField> = { ...current.debt?.fields };
  for (const field of changed) {
    owed[field] = owedAfterEdit(current, field);
    registers[field] = { value: (patch as Record<string, unknown>)[field], stamp };
  }
  const edited: StoredRecord = {
    ...withState(current, fromRegisters(registers)),
    debt: {
      since: current.debt?.since ?? deviceNowMs,
      fields: owed,
      ...(current.debt?.lost ? { lost: current.debt.lost } : {}),
      status: 'waiting',
    },
  };
  return edited as StoredRecord<T>;
}

/** The base stays the value that the writer last knew, however often the field is edited before it is sent. */
function owedAfterEdit(record: StoredRecord, field: string): OwedField {
  const owed = record.debt?.fields[field];
  if (owed) return owed;
  return { base: record.seq > 0 && field in record.fields ? stampOf(record, field) : null };
}
