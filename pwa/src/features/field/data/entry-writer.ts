import { receptionFromTap, type Tap } from '@harkmoor/sync-model/records/reception-from-tap';
import type { Reception } from '@harkmoor/sync-model/records/reception';
import type { OpenLog } from '../../../store/open-log';
import { editOf } from './edit-undo';
import { padDraftId } from './pad-drafts';
import { changeOutingMemory } from './field-settings';

/** Stores the entry that one tap makes; durable when it resolves. */
export async function logTap(log: OpenLog, tap: Tap): Promise<string> {
  const { id } = await log.writer.create('reception', receptionFromTap(tap));
  return id;
}

/**
 * Saves what the pad holds under the id that its draft had from the start, then drops the draft. Killed between
 * the two, the phone finds the entry saved and the draft answered: it is never offered or counted twice.
 */
export async function saveNewEntry(log: OpenLog, id: string, fields: Reception): Promise<void> {
  await log.writer.create('reception', fields, { id });
  await log.database.drafts.delete(padDraftId(id));
}

/** Saves an edit; the line with *Undo* offers what it replaced until the next entry. */
export async function saveEdit(
  log: OpenLog,
  id: string,
  patch: Partial<Reception>,
  nowMs: number,
): Promise<void> {
  const stored = await log.database.recordTable('reception').get([log.clubId, id]);
  await log.writer.edit('reception', id, patch);
  await log.database.drafts.delete(padDraftId(id));
  const edit = stored ? editOf(stored.fields, patch) : null;
  if (edit === null || !stored?.fields.outingId) return;
  const act = { kind: 'edited', receptionId: id, ...edit, atMs: nowMs } as const;
  await changeOutingMemory(log, stored.fields.outingId, { act });
}

/** Puts an entry into the bin; the line with *Undo* offers to take it out again. */
export async function binEntry(
  log: OpenLog,
  entry: { id: string; outingId: string | null },
  nowMs: number,
): Promise<void> {
  await log.writer.edit('reception', entry.id, { deleted: true });
  if (entry.outingId) {
    const act = { kind: 'binned', receptionId: entry.id, atMs: nowMs } as const;
    await changeOutingMemory(log, entry.outingId, { act });
  }
}
