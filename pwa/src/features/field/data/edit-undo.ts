import { canonicalJson } from '@harkmoor/sync-model/merge/canonical-json';
import type { Reception } from '@harkmoor/sync-model/records/reception';

/** What an edit replaced, and with what: enough to take exactly that back. */
export type EntryEdit = { readonly before: Partial<Reception>; readonly after: Partial<Reception> };

/** The fields of `patch` that change the entry; null where none does. */
export function editOf(stored: Reception, patch: Partial<Reception>): EntryEdit | null {
  const changed = fieldsOf(patch).filter((field) => !isSame(stored[field], patch[field]));
  return changed.length === 0 ? null : { before: picked(stored, changed), after: picked(patch, changed) };
}

/** What undoing the edit writes: fields that were changed again since, here or elsewhere, are left as they are. */
export function patchToUndo({ before, after }: EntryEdit, stored: Reception): Partial<Reception> {
  return picked(
    before,
    fieldsOf(before).filter((field) => isSame(stored[field], after[field])),
  );
}

function fieldsOf(fields: Partial<Reception>): (keyof Reception)[] {
  return Object.keys(fields) as (keyof Reception)[];
}

function picked(fields: Partial<Reception>, names: readonly (keyof Reception)[]): Partial<Reception> {
  return Object.fromEntries(names.map((name) => [name, fields[name]])) as Partial<Reception>;
}

function isSame(a: unknown, b: unknown): boolean {
  return canonicalJson(a) === canonicalJson(b);
}
