import type { Mode } from '@harkmoor/sync-model/records/common-fields';
import type { Reception } from '@harkmoor/sync-model/records/reception';
import type { TouchedScores } from '@harkmoor/sync-model/records/score-draft';
import { useLiveQuery } from 'dexie-react-hooks';
import { useActiveLog } from '../../../store/active-log';
import type { OpenLog } from '../../../store/open-log';
import type { RstParts } from '../rst-parts';

export const PAD_FORM = 'score-pad';

/** What the pad holds before *Save*. Everything that a reload must bring back stands here or in the address. */
export type PadValues = {
  /** The id that the reception has, or will have. */
  receptionId: string;
  outingId: string | null;
  /** One line that names it where it is offered again. */
  title: string;
  /** The address of the pad that this draft belongs to. */
  path: string;
  isEdit: boolean;
  outcome: Reception['outcome'];
  nilReason: Reception['nilReason'];
  /** The time of the entry, ms by the device clock. */
  atMs: number;
  scores: TouchedScores;
  /** The figures of an RST that were touched; `scores` holds the report once it is whole. */
  rstParts: RstParts;
  mode: Mode;
  dialHz: number;
  setupId: string;
  identity: Reception['identity'];
  stationName: string;
  remarks: string;
  programme: { at: number; text: string }[];
  /** Being typed, and when the typing began: the moment that was heard. */
  programmeText: string;
  programmeAt: number | null;
};

export type PadDraft = { id: string; savedAt: number; values: PadValues };

export function padDraftId(receptionId: string): string {
  return `${PAD_FORM}:${receptionId}`;
}

export async function keepPadDraft(log: OpenLog, values: PadValues, nowMs: number): Promise<void> {
  const id = padDraftId(values.receptionId);
  await log.database.drafts.put({ id, clubId: log.clubId, form: PAD_FORM, savedAt: nowMs, values });
}

export async function dropPadDraft(log: OpenLog, receptionId: string): Promise<void> {
  await log.database.drafts.delete(padDraftId(receptionId));
}

export async function readPadDraft(log: OpenLog, receptionId: string): Promise<PadValues | null> {
  const draft = await log.database.drafts.get(padDraftId(receptionId));
  return draft ? (draft.values as PadValues) : null;
}

/**
 * Drafts of this club that wait for an answer, newest first. A draft of a new entry whose reception is there was
 * saved a moment before the phone died: it is answered, and goes.
 */
export async function readOpenDrafts(log: OpenLog): Promise<PadDraft[]> {
  const drafts = await log.database.drafts.where('id').startsWith(`${PAD_FORM}:`).toArray();
  const open: PadDraft[] = [];
  for (const draft of drafts) {
    if (draft.clubId !== log.clubId) continue;
    const values = draft.values as PadValues;
    const stored = await log.database.recordTable('reception').get([log.clubId, values.receptionId]);
    if (stored && !values.isEdit) continue;
    open.push({ id: draft.id, savedAt: draft.savedAt, values });
  }
  return open.sort((a, b) => b.savedAt - a.savedAt);
}

export function useOpenDrafts(): PadDraft[] | undefined {
  const log = useActiveLog();
  return useLiveQuery(() => readOpenDrafts(log), [log]);
}
