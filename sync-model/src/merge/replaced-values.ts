import { parseStamp, type Stamp } from '../stamp/stamp.js';
import { sameValue } from './canonical-json.js';
import { isLater } from './merge-record.js';
import { stampOf, type FieldValue, type RecordState } from './record-state.js';

type Register = { readonly value: FieldValue; readonly stamp: Stamp };

/** One field on which an arriving change and the stored record differ: what stays and what was replaced. */
export type ReplacedValue = {
  readonly field: string;
  readonly replaced: Register;
  readonly kept: Register;
  /** The writer had not seen the value that it met. */
  readonly clash: boolean;
};

/** Fields whose replaced values are never kept: a place could tell an exact point that was coarsened later. */
const NO_HISTORY_FIELDS: readonly string[] = ['place'];

export function hasHistory(field: string): boolean {
  return !NO_HISTORY_FIELDS.includes(field);
}

/**
 * The history rows that `change` makes on `stored`: one for each field where two values met, whichever won.
 * A repeat of a change makes none.
 */
export function replacedValues(
  stored: RecordState,
  change: RecordState,
  base: Readonly<Record<string, Stamp>> | undefined,
): ReplacedValue[] {
  return Object.keys(change.fields).flatMap((field) => {
    if (!(field in stored.fields) || !hasHistory(field)) return [];
    const current = { value: stored.fields[field], stamp: stampOf(stored, field) };
    const incoming = { value: change.fields[field], stamp: stampOf(change, field) };
    if (incoming.stamp === current.stamp && sameValue(incoming.value, current.value)) return [];
    const wins = isLater(incoming, current);
    const clash = base?.[field] !== current.stamp && !isOwnEarlierValue(current.stamp, incoming.stamp);
    if (!wins && sameValue(incoming.value, current.value)) return [];
    return [{ field, replaced: wins ? current : incoming, kept: wins ? incoming : current, clash }];
  });
}

/** A device has always seen its own values, even where the answer that told of their arrival was lost. */
function isOwnEarlierValue(current: Stamp, incoming: Stamp): boolean {
  return current < incoming && parseStamp(current).deviceId === parseStamp(incoming).deviceId;
}
