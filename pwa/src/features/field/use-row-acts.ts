import { useMemo, useRef, useState } from 'react';
import { useIonRouter } from '@ionic/react';
import type { NilReason, Tap } from '@harkmoor/sync-model/records/reception-from-tap';
import { buzz } from '../../platform/vibrate';
import type { StoredTarget } from './data/outing-frame';
import type { StoredOuting } from './data/running-outing';
import { useFieldActions } from './data/use-field-actions';
import { padForEdit, padForRow } from './pad-paths';
import { createTapGuard } from './tap-guard';
import type { RowActs } from './ui/TargetRow';
import { useAct } from './use-act';

/** What was asked about a row and waits for an answer. */
export type RowQuestion =
  { kind: 'nil-reason'; target: StoredTarget; atMs: number } | { kind: 'more'; target: StoredTarget };

/** The acts of the rows of one round. Each takes the moment of the tap as the time of the entry. */
export function useRowActs(outing: StoredOuting, roundNo: number, touchRows: () => void) {
  const router = useIonRouter();
  const actions = useFieldActions();
  const act = useAct();
  const guard = useRef(createTapGuard());
  const [question, setQuestion] = useState<RowQuestion | null>(null);
  const [triedAnyway, setTriedAnyway] = useState<ReadonlySet<string>>(new Set());

  const acts = useMemo(() => {
    const accepts = (target: StoredTarget): boolean => {
      touchRows();
      return guard.current.accepts(target.id, performance.now());
    };
    const answer = (target: StoredTarget, given: Pick<Tap, 'outcome' | 'nilReason' | 'deviceAtMs'>): void => {
      buzz();
      const subject = { kind: 'row', targetId: target.id, target: target.fields, roundNo } as const;
      void act(() => actions.logTap({ ...given, subject, outingId: outing.id, outing: outing.fields }));
    };
    const openPad = (target: StoredTarget, atMs: number): void => {
      buzz();
      router.push(padForRow(target, roundNo, atMs, actions.newId()));
    };
    const rows: RowActs = {
      onHeard: (target, atMs) => accepts(target) && openPad(target, atMs),
      onNil: (target, atMs) => accepts(target) && answer(target, { outcome: 'nil', deviceAtMs: atMs }),
      onNilReason: (target, atMs) => accepts(target) && setQuestion({ kind: 'nil-reason', target, atMs }),
      onTryAnyway: (target) => accepts(target) && setTriedAnyway((tried) => new Set(tried).add(target.id)),
      onMore: (target) => accepts(target) && setQuestion({ kind: 'more', target }),
      onEdit: (entry) => {
        touchRows();
        const row = entry.fields.targetId ?? entry.id;
        if (guard.current.accepts(row, performance.now())) router.push(padForEdit(entry.id));
      },
    };
    return {
      rows,
      nil: (target: StoredTarget, nilReason: NilReason, atMs: number) =>
        answer(target, { outcome: 'nil', nilReason, deviceAtMs: atMs }),
      skip: (target: StoredTarget) => answer(target, { outcome: 'skipped', deviceAtMs: Date.now() }),
      hear: (target: StoredTarget) => openPad(target, Date.now()),
    };
  }, [act, actions, outing, roundNo, router, touchRows]);

  return { ...acts, question, closeQuestion: () => setQuestion(null), triedAnyway };
}
