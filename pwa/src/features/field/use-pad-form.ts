import { useCallback, useEffect, useEffectEvent, useRef, useState } from 'react';
import { useUnsavedWork } from '../../platform/unsaved-work';
import type { PadStart } from './data/pad-start';
import type { PadValues } from './data/pad-drafts';
import { usePadLog } from './data/use-pad-log';
import { receptionFromPad, samePadValues } from './pad-values';
import { rstOf } from './rst-parts';
import { useAct } from './use-act';

/** A draft is durable so long after each change. */
export const DRAFT_AFTER_MS = 300;

type ReadyStart = Extract<PadStart, { kind: 'ready' }>;

/** The pad as it is being filled: every change becomes a durable draft, and nothing counts before `save`. */
export function usePadForm(start: ReadyStart) {
  const log = usePadLog();
  const act = useAct();
  const [values, setValues] = useState(start.values);
  const [isSaving, setSaving] = useState(false);
  const isAnswered = useRef(false);
  const isDirty = !samePadValues(values, start.untouched);
  useUnsavedWork(isDirty && !isSaving);

  const keepDraft = useEffectEvent(() => {
    // an edit that changes nothing is no draft; a new entry is one from its tap on
    if (isAnswered.current || (values.isEdit && !isDirty)) return;
    void act(() => log.keepDraft(values));
  });
  useEffect(() => {
    const timer = setTimeout(keepDraft, DRAFT_AFTER_MS);
    return () => clearTimeout(timer);
  }, [values]);

  const leave = useEffectEvent(() => {
    if (isAnswered.current) return;
    // left untouched, the tap was a slip; left half-filled, it is offered again in Field
    void act(() => (isDirty ? log.keepDraft(values) : log.dropDraft(values.receptionId)));
  });
  useEffect(() => () => leave(), []);

  const change = useCallback((part: Partial<PadValues>) => setValues((known) => ({ ...known, ...part })), []);
  const changeScores = useCallback(
    (part: Partial<PadValues['scores']>) =>
      setValues((known) => ({ ...known, scores: { ...known.scores, ...part } })),
    [],
  );
  /** The tone of an RST belongs to telegraphy: a report follows its mode. */
  const changeMode = useCallback(
    (mode: PadValues['mode']) =>
      setValues((known) => {
        const { rst } = known.scores;
        const scores = rst ? { ...known.scores, rst: rstOf(known.rstParts, mode === 'CW') } : known.scores;
        return { ...known, mode, scores };
      }),
    [],
  );
  const answer = async (work: () => Promise<unknown>): Promise<boolean> => {
    setSaving(true);
    isAnswered.current = true;
    const isDone = await act(work);
    if (!isDone) isAnswered.current = false;
    setSaving(false);
    return isDone;
  };
  return {
    values,
    outlined: start.outlined,
    change,
    changeScores,
    changeMode,
    isDirty,
    isSaving,
    save: () => answer(() => log.save(values, receptionFromPad(start.base, values, start.outlined))),
    bin: () => answer(() => log.bin(values)),
  };
}

export type PadForm = ReturnType<typeof usePadForm>;
