import type { Stamp } from '../stamp/stamp.js';
import { canonicalJson } from './canonical-json.js';
import { fromRegisters, stampOf, type FieldValue, type RecordState } from './record-state.js';

/**
 * Joins two versions of one record field by field, the later stamp winning. Commutative, associative and
 * idempotent, so any order and any number of deliveries leave every device with the same record. Deletion is
 * a field: an edit of another field never restores, restoring is an edit of `deleted`.
 */
export function mergeRecord(ours: RecordState, theirs: RecordState): RecordState {
  const registers: Record<string, { value: FieldValue; stamp: Stamp }> = {};
  for (const state of [ours, theirs]) {
    for (const field of Object.keys(state.fields)) {
      const incoming = { value: state.fields[field], stamp: stampOf(state, field) };
      const current = registers[field];
      registers[field] = current && !isLater(incoming, current) ? current : incoming;
    }
  }
  return fromRegisters(registers);
}

/** A tie of stamps can only come from a fault; the value then decides, the same way everywhere. */
export function isLater(
  incoming: { value: FieldValue; stamp: Stamp },
  current: { value: FieldValue; stamp: Stamp },
): boolean {
  if (incoming.stamp !== current.stamp) return incoming.stamp > current.stamp;
  if (incoming.value === current.value) return false;
  return canonicalJson(incoming.value) > canonicalJson(current.value);
}
