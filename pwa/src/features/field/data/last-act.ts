import { mendToUndo, type SetupMend } from '@harkmoor/sync-model/records/batch-mend';
import type { OpenLog } from '../../../store/open-log';
import type { WriteStep } from '../../../store/log-writer';
import { patchToUndo, type EntryEdit } from './edit-undo';
import { changeOutingMemory } from './field-settings';
import { readEntries, type StoredReception } from './outing-entries';

/** An act other than a new entry that the line with *Undo* offers to take back. */
export type UndoableAct = { atMs: number } & (
  | { kind: 'binned'; receptionId: string }
  | { kind: 'put-back'; receptionId: string }
  | { kind: 'mended'; mend: SetupMend }
  | ({ kind: 'edited'; receptionId: string } & EntryEdit)
);

/** What the line with *Undo* speaks of: the newest entry, or an act that came after it. */
export type LastAct =
  | { kind: 'entry'; entry: StoredReception }
  | { kind: 'binned'; entry: StoredReception }
  | { kind: 'edited'; entry: StoredReception; edit: EntryEdit }
  | { kind: 'mended'; mend: SetupMend };

/**
 * The act that can be taken back now; null where there is none. `entries` are those of the outing, binned ones
 * too. The next entry ends the offer of the one before.
 */
export function lastActOf(entries: readonly StoredReception[], act: UndoableAct | null): LastAct | null {
  const newest = entries.reduce<StoredReception | null>(
    (best, entry) => (!entry.fields.deleted && (best === null || entry.id > best.id) ? entry : best),
    null,
  );
  if (act && (newest === null || act.atMs >= madeAtMs(newest.id))) {
    if (act.kind === 'mended') return act;
    const entry = entries.find(({ id }) => id === act.receptionId);
    if (!entry) return null;
    if (act.kind === 'edited') return editedAct(act, entry, newest);
    if (act.kind === 'binned' && entry.fields.deleted) return { kind: 'binned', entry };
    // a put-back entry may be taken out again; nothing older is offered after it
    return entry.fields.deleted ? null : { kind: 'entry', entry };
  }
  return newest ? { kind: 'entry', entry: newest } : null;
}

function editedAct(edit: EntryEdit, entry: StoredReception, newest: StoredReception | null): LastAct | null {
  const canBeUndone = !entry.fields.deleted && Object.keys(patchToUndo(edit, entry.fields)).length > 0;
  if (canBeUndone) return { kind: 'edited', entry, edit };
  return newest ? { kind: 'entry', entry: newest } : null;
}

/** Takes the act back: an entry goes to the bin, a binned one comes out of it, a mend is undone entry by entry, an edit field by field. */
export async function undo(log: OpenLog, outingId: string, act: LastAct, nowMs: number): Promise<void> {
  if (act.kind === 'mended') {
    const entries = await readEntries(log, outingId);
    const steps = mendToUndo(act.mend, entries).map(({ id, setupId }): WriteStep => ({
      kind: 'edit',
      type: 'reception',
      id,
      patch: { setupId },
    }));
    if (steps.length > 0) await log.writer.apply(steps);
    await changeOutingMemory(log, outingId, { act: null });
    return;
  }
  if (act.kind === 'edited') {
    const { id, fields } = act.entry;
    await log.writer.edit('reception', id, patchToUndo(act.edit, fields));
    await changeOutingMemory(log, outingId, { act: null });
    return;
  }
  const isBinned = act.kind === 'binned';
  await log.writer.edit('reception', act.entry.id, { deleted: !isBinned });
  const kind = isBinned ? 'put-back' : 'binned';
  await changeOutingMemory(log, outingId, { act: { kind, receptionId: act.entry.id, atMs: nowMs } });
}

/** When a record was made, ms by the clock of the device that made it: the first 48 bits of its UUIDv7. */
export function madeAtMs(id: string): number {
  return parseInt(id.slice(0, 8) + id.slice(9, 13), 16);
}
