import type { FieldValue, RecordState } from '../merge/record-state.js';
import type { FieldsByType } from '../records/schemas.js';
import type { RecordType } from '../records/record-types.js';
import type { RefusalCode } from '../protocol/messages.js';
import type { Stamp } from '../stamp/stamp.js';

/** What the phone still has to tell about the value that one field has now. */
export type OwedField = {
  /** Stamp of the value that the edit replaced, as this phone knew it; null in a record the server never had. */
  readonly base: Stamp | null;
  /** Stamp of a server value that came later than `base` and that ours, being later still, stays above. */
  readonly over?: Stamp;
};

/** A value of ours that a later one from elsewhere replaced before it was sent: it must still reach the history. */
export type LostValue = {
  readonly field: string;
  readonly value: FieldValue;
  readonly stamp: Stamp;
  readonly base: Stamp | null;
};

/**
 * The debt of a record: it stands in the record's own row, so that neither can be stored without the other.
 * A record without debt has no `debt` key.
 */
export type Debt = {
  /** Local order of the first unsent edit, ms of the device clock; never compared across devices. */
  readonly since: number;
  readonly fields: Readonly<Record<string, OwedField>>;
  /** Oldest first; each is sent before the field's present value. */
  readonly lost?: readonly LostValue[];
  readonly status: 'waiting' | 'held' | 'refused';
  /** Id of the parent that the server did not know. */
  readonly needs?: string;
  readonly code?: RefusalCode;
  readonly message?: string;
};

/** A record as the phone keeps it. `seq` is 0 until the server has answered or sent it. */
export type StoredRecord<T extends RecordType = RecordType> = RecordState & {
  readonly clubId: string;
  readonly type: T;
  readonly id: string;
  readonly ownerId: string | null;
  readonly seq: number;
  readonly fields: T extends keyof FieldsByType ? FieldsByType[T] : Readonly<Record<string, unknown>>;
  readonly debt?: Debt;
};

/** What a person is told about one record. `sending` is known only to the running engine. */
export type SendState = 'only-here' | 'sending' | 'sent' | 'needs-attention';

export function sendStateOf(record: Pick<StoredRecord, 'debt'>, isInFlight: boolean): SendState {
  if (!record.debt) return 'sent';
  if (record.debt.status === 'refused') return 'needs-attention';
  return isInFlight ? 'sending' : 'only-here';
}

/** The record with other fields and stamps; `stamps` vanishes, not lingers, where it is no longer needed. */
export function withState(record: StoredRecord, { at, fields, stamps }: RecordState): StoredRecord {
  const { stamps: _stamps, ...rest } = record;
  return { ...rest, at, fields, ...(stamps ? { stamps } : {}) };
}

/** The record with another debt; the key vanishes where nothing is owed any more. */
export function withDebt(record: StoredRecord, debt: Debt): StoredRecord {
  const { debt: _debt, ...rest } = record;
  const { lost, ...others } = debt;
  const isOwed = Object.keys(debt.fields).length > 0 || (lost?.length ?? 0) > 0;
  return isOwed ? { ...rest, debt: lost?.length ? { ...others, lost } : others } : rest;
}
