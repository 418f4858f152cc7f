import { fromRegisters, stampOf, type FieldValue } from '../merge/record-state.js';
import type { Change } from '../protocol/messages.js';
import { isWritableType } from '../records/record-types.js';
import type { Stamp } from '../stamp/stamp.js';
import type { StoredRecord } from './stored-record.js';

/** A change as it is sent, with the stamp of each field that it tells, empty ones included. */
export type OwedChange = {
  readonly change: Change;
  readonly stamps: Readonly<Record<string, Stamp>>;
};

type Register = { readonly value: FieldValue; readonly stamp: Stamp; readonly base: Stamp | null };

/**
 * What is to be sent next of a record with a debt: all of it where the server does not know it, else each
 * owed field. A field that has lost values sends the oldest of those first, the present one in a later round.
 */
export function owedChange(record: StoredRecord): OwedChange {
  const { type, id } = record;
  if (!isWritableType(type)) throw new Error(`a record of type ${type} is never sent`);
  const registers = isOwedWhole(record) ? wholeRegisters(record) : owedRegisters(record);
  const { at, fields, stamps } = fromRegisters(registers);
  const change: Change = {
    type,
    id,
    at,
    fields: { ...fields },
    ...(stamps ? { stamps: { ...stamps } } : {}),
  };
  if (isOwedWhole(record)) change.fields = withoutEmpty(fields);
  else change.base = basesOf(registers);
  const sent = Object.entries(registers).map(([field, { stamp }]) => [field, stamp] as const);
  return { change, stamps: Object.fromEntries(sent) };
}

/** True where the server is not known to hold any value of the record. */
export function isOwedWhole(record: StoredRecord): boolean {
  const owed = record.debt?.fields ?? {};
  return Object.keys(record.fields).every((field) => owed[field]?.base === null);
}

/** The record with all its fields owed anew, as if the server had never heard of it. */
export function owedAnew(record: StoredRecord, deviceNowMs: number): StoredRecord {
  const fields = Object.fromEntries(Object.keys(record.fields).map((field) => [field, { base: null }]));
  const { lost, since = deviceNowMs } = record.debt ?? {};
  return { ...record, seq: 0, debt: { since, fields, ...(lost ? { lost } : {}), status: 'waiting' } };
}

function wholeRegisters(record: StoredRecord): Record<string, Register> {
  const entries = Object.entries(record.fields).map(
    ([field, value]) => [field, { value, stamp: stampOf(record, field), base: null }] as const,
  );
  return Object.fromEntries(entries);
}

function owedRegisters(record: StoredRecord): Record<string, Register> {
  const registers: Record<string, Register> = {};
  for (const lost of record.debt?.lost ?? []) registers[lost.field] ??= lost;
  for (const [field, { base }] of Object.entries(record.debt?.fields ?? {})) {
    registers[field] ??= { value: record.fields[field], stamp: stampOf(record, field), base };
  }
  return registers;
}

function basesOf(registers: Readonly<Record<string, Register>>): Record<string, Stamp> {
  const known = Object.entries(registers).flatMap(([field, { base }]) =>
    base === null ? [] : [[field, base] as const],
  );
  return Object.fromEntries(known);
}

function withoutEmpty(fields: Readonly<Record<string, FieldValue>>): Record<string, FieldValue> {
  return Object.fromEntries(Object.entries(fields).filter(([, value]) => value !== null));
}
