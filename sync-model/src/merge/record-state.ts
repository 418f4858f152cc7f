import type { Stamp } from '../stamp/stamp.js';

/** Anything JSON can hold; composite values are one field under one stamp (records.md). */
export type FieldValue = unknown;

/**
 * A record as it is stored and sent: `at` is the stamp of every field that `stamps` does not name. A record of
 * a known type always has all its fields, null where empty; a change has only the fields it changes.
 */
export type RecordState = {
  readonly at: Stamp;
  readonly fields: Readonly<Record<string, FieldValue>>;
  readonly stamps?: Readonly<Record<string, Stamp>>;
};

export function stampOf(state: RecordState, field: string): Stamp {
  return state.stamps?.[field] ?? state.at;
}

/** Builds a record from fields with a stamp each; `at` is the earliest, so equal registers give equal records. */
export function fromRegisters(
  registers: Readonly<Record<string, { value: FieldValue; stamp: Stamp }>>,
): RecordState {
  const names = Object.keys(registers).sort();
  let at: Stamp | undefined;
  for (const name of names) {
    const { stamp } = registers[name]!;
    if (at === undefined || stamp < at) at = stamp;
  }
  if (at === undefined) throw new Error('a record needs at least one field');
  const fields: Record<string, FieldValue> = {};
  const stamps: Record<string, Stamp> = {};
  for (const name of names) {
    const { value, stamp } = registers[name]!;
    fields[name] = value;
    if (stamp !== at) stamps[name] = stamp;
  }
  return Object.keys(stamps).length > 0 ? { at, fields, stamps } : { at, fields };
}
