import { useRef } from 'react';
import { useIonRouter } from '@ionic/react';
import { onAirState } from '@harkmoor/sync-model/evidence/schedule';
import type { TapSubject } from '@harkmoor/sync-model/records/reception-from-tap';
import { buzz } from '../../platform/vibrate';
import { useClub } from './data/club';
import { useOutingFrame, type StoredTarget } from './data/outing-frame';
import type { StoredOuting } from './data/running-outing';
import { useFieldActions } from './data/use-field-actions';
import { padForFrequency } from './pad-paths';
import { createTapGuard } from './tap-guard';
import { useAct } from './use-act';
import { useFrequencyEntry, type FrequencyEntry } from './use-frequency-entry';
import { useGoToField } from './use-go-to-field';

/** The frequency that is being entered, with its three answers. */
export function useFrequencyAnswers(outing: StoredOuting) {
  const { ituRegion } = useClub();
  const entry = useFrequencyEntry(ituRegion);
  const frame = useOutingFrame(outing);
  const router = useIonRouter();
  const goToField = useGoToField();
  const actions = useFieldActions();
  const act = useAct();
  const guard = useRef(createTapGuard());
  const target = targetOn(entry.frequencyHz, frame?.targets ?? []);

  const openPad = (means: 'planned' | 'chance'): void => {
    const { frequencyHz: dialHz, mode } = entry;
    if (dialHz === null || !guard.current.accepts(answerKey(dialHz), performance.now())) return;
    buzz();
    const entered = { dialHz, mode, means, targetId: target?.id ?? null };
    // the pad takes this page's place in the history: back from it leads to Field
    router.push(padForFrequency(entered, Date.now(), actions.newId()), 'forward', 'replace');
  };
  const logNil = (): void => {
    const subject = plannedSubject(entry, target);
    if (subject === null || entry.frequencyHz === null) return;
    if (!guard.current.accepts(answerKey(entry.frequencyHz), performance.now())) return;
    buzz();
    const tap = { outcome: 'nil' as const, subject, outingId: outing.id, outing: outing.fields };
    const deviceAtMs = Date.now();
    void act(() => actions.logTap({ ...tap, deviceAtMs })).then((isDone) => isDone && goToField());
  };
  return { entry, target, openPad, logNil };
}

/** A quick answer on another frequency is another answer, no trembling thumb. */
function answerKey(frequencyHz: number): string {
  return String(frequencyHz);
}

function plannedSubject(entry: FrequencyEntry, target: StoredTarget | null): TapSubject | null {
  if (entry.frequencyHz === null) return null;
  const bound = target ? { target: { id: target.id, fields: target.fields } } : {};
  return { kind: 'frequency', dialHz: entry.frequencyHz, mode: entry.mode, basis: 'planned', ...bound };
}

/** The one target of the outing's list on this very frequency: the only one there, or the only one on the air now. */
function targetOn(frequencyHz: number | null, targets: readonly StoredTarget[]): StoredTarget | null {
  const there = targets.filter(({ fields }) => fields.frequencyHz === frequencyHz);
  if (there.length <= 1) return there[0] ?? null;
  const onAir = there.filter(({ fields }) => onAirState(fields, Date.now()).kind === 'on');
  return onAir.length === 1 ? onAir[0]! : null;
}
