import type { z } from 'zod';
import type { RecordState } from '../merge/record-state.js';
import type { Change, Refusal } from '../protocol/messages.js';
import { CHANGE_BYTES_MAX } from '../protocol/limits.js';
import { isWithinBytes } from '../protocol/utf8-bytes.js';
import { FIELD_NAMES, withEmptyFields } from '../records/field-names.js';
import { RECORD_SCHEMAS } from '../records/schemas.js';
import type { Stamp } from '../stamp/stamp.js';
import type { HubKey } from './ports.js';

/** A change whose values are within the schema and the limits. */
export type CheckedChange = {
  readonly key: HubKey;
  /** All fields where the change is a whole record, else the changed ones. */
  readonly state: RecordState;
  readonly base: Readonly<Record<string, Stamp>> | undefined;
};

/**
 * Checks one change without knowing the stored record: a whole record (no `base`) against its schema, with
 * absent fields taken as empty; a change of an existing one field by field. Cross-field rules are no reason
 * to refuse. A refusal names the field.
 */
export function checkChange(change: Change): CheckedChange | Refusal {
  const refusal = limitsRefusal(change) ?? namesRefusal(change);
  if (refusal) return refusal;
  const { type, id, at, stamps, base } = change;
  const fields = base ? change.fields : withEmptyFields(type, change.fields);
  const broken = base ? changedFieldsRefusal(change) : wholeRecordRefusal(change, fields);
  if (broken) return broken;
  return { key: { type, id }, state: { at, fields, ...(stamps ? { stamps } : {}) }, base };
}

export function isRefusal(checked: CheckedChange | Refusal): checked is Refusal {
  return 'code' in checked;
}

function limitsRefusal(change: Change): Refusal | null {
  if (isWithinBytes(JSON.stringify(change), CHANGE_BYTES_MAX)) return null;
  return { code: 'too-large', message: 'This record is too large to be sent. Shorten its texts.' };
}

function namesRefusal({ type, fields, stamps, base }: Change): Refusal | null {
  const known = FIELD_NAMES[type];
  const unknown = Object.keys(fields).find((field) => !known.includes(field));
  if (unknown !== undefined) return invalid(unknown, 'is not a field of this record');
  const stamped = Object.keys(stamps ?? {}).find(
    (field) => !(base ? field in fields : known.includes(field)),
  );
  if (stamped !== undefined) return invalid(stamped, 'has a stamp but no value');
  const based = Object.keys(base ?? {}).find((field) => !(field in fields));
  if (based !== undefined) return invalid(based, 'has a base but no value');
  if (base && Object.keys(fields).length === 0)
    return { code: 'invalid', message: 'The change has no field.' };
  return null;
}

function wholeRecordRefusal({ type }: Change, fields: Record<string, unknown>): Refusal | null {
  const parsed = RECORD_SCHEMAS[type].safeParse(fields);
  return parsed.success ? null : issueRefusal(parsed.error);
}

function changedFieldsRefusal({ type, fields }: Change): Refusal | null {
  const shape: Readonly<Record<string, z.ZodType>> = RECORD_SCHEMAS[type].shape;
  for (const [field, value] of Object.entries(fields)) {
    const parsed = shape[field]!.safeParse(value);
    if (!parsed.success) return issueRefusal(parsed.error, field);
  }
  return null;
}

function issueRefusal(error: z.ZodError, field?: string): Refusal {
  const [issue] = error.issues;
  const path = [...(field === undefined ? [] : [field]), ...(issue?.path ?? [])].map(String);
  return invalid(path.join('.') || 'record', `is not valid (${issue?.message ?? 'unknown reason'})`);
}

function invalid(field: string, reason: string): Refusal {
  return { code: 'invalid', message: `The field “${field.slice(0, 80)}” ${reason}.` };
}
