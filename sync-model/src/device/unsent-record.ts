import { isLater } from '../merge/merge-record.js';
import { fromRegisters, stampOf } from '../merge/record-state.js';
import type { Stamp } from '../stamp/stamp.js';
import { withDebt, type Debt, type LostValue, type OwedField, type StoredRecord } from './stored-record.js';

/**
 * Brings what another device of the same account could not send into the record as this phone holds it. Of each
 * owed field the later stamp stays and is owed here; an earlier one joins the lost values, so that it still reaches
 * the history. Values that both devices have change nothing, so a second reading adds nothing.
 */
export function withUnsent(known: StoredRecord, unsent: StoredRecord): StoredRecord {
  const registers: Record<string, { value: unknown; stamp: Stamp }> = {};
  for (const field of Object.keys(known.fields)) {
    registers[field] = { value: known.fields[field], stamp: stampOf(known, field) };
  }
  const fields: Record<string, OwedField> = { ...known.debt?.fields };
  const lost: LostValue[] = [...(known.debt?.lost ?? [])];
  let hasNews = false;
  const lose = (value: LostValue): void => {
    if (lost.some((other) => other.field === value.field && other.stamp === value.stamp)) return;
    lost.push(value);
    hasNews = true;
  };
  for (const [field, owed] of Object.entries(unsent.debt?.fields ?? {})) {
    const incoming = { value: unsent.fields[field], stamp: stampOf(unsent, field) };
    const current = registers[field];
    if (current && current.stamp === incoming.stamp) continue;
    if (current && !isLater(incoming, current)) {
      lose({ field, ...incoming, base: owed.base });
      continue;
    }
    registers[field] = incoming;
    fields[field] = { base: owed.base, ...(current ? { over: current.stamp } : {}) };
    hasNews = true;
  }
  for (const value of unsent.debt?.lost ?? []) lose(value);
  if (!hasNews) return known;
  const debt: Debt = {
    since: known.debt?.since ?? unsent.debt?.since ?? 0,
    fields,
    ...(lost.length > 0 ? { lost } : {}),
    status: 'waiting',
  };
  const { at, fields: values, stamps } = fromRegisters(registers);
  return withDebt({ ...known, at, fields: values, stamps }, debt);
}
