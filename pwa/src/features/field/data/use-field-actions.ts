import { useMemo } from 'react';
import type { Tap } from '@harkmoor/sync-model/records/reception-from-tap';
import type { OutingStart } from '@harkmoor/sync-model/records/outing-from-start';
import type { Outing } from '@harkmoor/sync-model/records/outing';
import { useActiveLog } from '../../../store/active-log';
import type { OpenLog } from '../../../store/open-log';
import { saveClockCheck } from './clock-checks';
import { binEntry, logTap } from './entry-writer';
import { changeOutingMemory } from './field-settings';
import { undo, type LastAct } from './last-act';
import {
  changeList,
  confirmSetup,
  endOuting,
  mendSetup,
  noteClockStep,
  startOuting,
  switchSetup,
} from './outing-writer';
import { dropPadDraft } from './pad-drafts';
import { quickStart, type QuickStart } from './quick-start';
import type { StoredOuting } from './running-outing';

type Moment = { atMs: number; roundNo: number };

/** What the field's screens can do to the open log. Each is durable when it resolves. */
export function useFieldActions() {
  const log = useActiveLog();
  return useMemo(() => fieldActions(log), [log]);
}

export type FieldActions = ReturnType<typeof fieldActions>;

function fieldActions(log: OpenLog) {
  return {
    newId: () => log.writer.newId(),
    logTap: (tap: Tap) => logTap(log, tap),
    bin: (entry: { id: string; outingId: string | null }, nowMs: number) => binEntry(log, entry, nowMs),
    undo: (outingId: string, act: LastAct, nowMs: number) => undo(log, outingId, act, nowMs),
    dropDraft: (receptionId: string) => dropPadDraft(log, receptionId),
    startOuting: (start: OutingStart, nowMs: number) => startOuting(log, start, nowMs),
    quickStart: (form: QuickStart, nowMs: number) => quickStart(log, form, nowMs),
    endOuting: (outing: StoredOuting, atMs: number, by: NonNullable<Outing['ended']>['by']) =>
      endOuting(log, outing, atMs, by),
    switchSetup: (outing: StoredOuting, setupId: string, now: Moment) =>
      switchSetup(log, outing, setupId, now),
    confirmSetup: (outingId: string, setupId: string, now: Moment) =>
      confirmSetup(log, outingId, setupId, now),
    mendSetup: (outing: StoredOuting, mended: Parameters<typeof mendSetup>[2]) =>
      mendSetup(log, outing, mended),
    changeList: (outing: StoredOuting, listId: string | null) => changeList(log, outing, listId),
    startRound: (outingId: string, roundNo: number) => changeOutingMemory(log, outingId, { roundNo }),
    readCautions: (outingId: string) => changeOutingMemory(log, outingId, { cautionsRead: true }),
    noteClockStep: (outing: StoredOuting, step: { at: number; stepMs: number }) =>
      noteClockStep(log, outing, step),
    saveClockCheck: (check: Parameters<typeof saveClockCheck>[1]) => saveClockCheck(log, check),
  };
}
