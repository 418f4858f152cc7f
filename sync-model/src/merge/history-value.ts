import { jsonBytes } from '../protocol/utf8-bytes.js';
import { FIELD_BYTES_HISTORY_MAX } from '../protocol/limits.js';
import type { FieldValue } from './record-state.js';

/** Stands in the history for a value that was too long to keep twice. */
export type LeftOutValue = { readonly leftOutBytes: number };

/** The value as the history keeps it: itself, or its size where it is longer than 4 KiB. */
export function historyValue(value: FieldValue): FieldValue | LeftOutValue {
  const bytes = jsonBytes(value);
  return bytes > FIELD_BYTES_HISTORY_MAX ? { leftOutBytes: bytes } : value;
}

/** True where a history row has only the size of a value, which then cannot be put back. */
export function isLeftOut(value: FieldValue): value is LeftOutValue {
  return typeof value === 'object' && value !== null && 'leftOutBytes' in value;
}
