import { useMemo } from 'react';
import { clockTrust, type ClockTrust } from '@harkmoor/sync-model/evidence/clock-trust';
import { onAirState, type OnAirState } from '@harkmoor/sync-model/evidence/schedule';
import { forgottenSince } from '@harkmoor/sync-model/records/forgotten-outing';
import { currentRoundNo, roundOf, type Round } from '@harkmoor/sync-model/records/round';
import { isSetupQuestionDue } from '@harkmoor/sync-model/records/setup-question';
import { stampOf } from '@harkmoor/sync-model/merge/record-state';
import { stampWallMs } from '@harkmoor/sync-model/stamp/stamp';
import { useMinute } from '../../platform/tick';
import { useOwnChecks } from './data/clock-checks';
import { useOutingMemory, type OutingMemory } from './data/field-settings';
import { lastActOf, type LastAct } from './data/last-act';
import { useOutingEntries, type StoredReception } from './data/outing-entries';
import { useOutingFrame, type OutingFrame, type StoredTarget } from './data/outing-frame';
import type { StoredOuting } from './data/running-outing';
import { useStillWhile } from './use-still-while';

export type RunningField = {
  outing: StoredOuting;
  frame: OutingFrame;
  memory: OutingMemory;
  /** Device time floored to the minute, ms UTC: what entries are made with. */
  minuteMs: number;
  /** The same by the clock check where it is trusted: what the sun and the schedules go by. */
  trueMs: number;
  trust: ClockTrust;
  /** Entries that stand, in the order in which they were made. */
  entries: StoredReception[];
  roundNo: number;
  round: Round<StoredTarget, StoredReception>;
  onAir: ReadonlyMap<string, OnAirState>;
  lastAct: LastAct | null;
  /** The newest heard entry: what *Same again* starts from. */
  sameAgain: StoredReception | null;
  isSetupQuestionDue: boolean;
  /** When the outing seems to have ended unnoticed, ms UTC; null while it is alive. */
  forgottenAt: number | null;
};

/** Everything that the screen of a running outing shows; null while it is first read. */
export function useRunningField(outing: StoredOuting, areRowsStill: boolean): RunningField | null {
  const frame = useOutingFrame(outing);
  const allEntries = useOutingEntries(outing.id);
  const memory = useOutingMemory(outing.id);
  const checks = useOwnChecks();
  const minuteMs = useMinute();
  const targets = useStillWhile(areRowsStill, frame?.targets);
  return useMemo(() => {
    if (!frame || !allEntries || !memory || !checks || !targets) return null;
    const trust = clockTrust(checks, outing.fields.clockSteps, minuteMs);
    const trueMs = minuteMs + (trust.kind === 'checked' ? trust.check.offsetMs : 0);
    const entries = allEntries.filter(({ fields }) => !fields.deleted);
    const roundNo = currentRoundNo(entries, memory.roundNo);
    const onAir = new Map(targets.map((target) => [target.id, onAirState(target.fields, trueMs)]));
    const switchedAtMs = stampWallMs(stampOf(outing, 'currentSetupId'));
    const setupNow = { setupId: outing.fields.currentSetupId, switchedAtMs, atMs: minuteMs, roundNo };
    return {
      outing,
      frame,
      memory,
      minuteMs,
      trueMs,
      trust,
      entries,
      roundNo,
      round: roundOf({ targets, entries, roundNo, isOnAir: ({ id }) => onAir.get(id)?.kind === 'on' }),
      onAir,
      lastAct: lastActOf(allEntries, memory.act),
      sameAgain: entries.findLast(({ fields }) => fields.outcome === 'heard' && !fields.swap) ?? null,
      isSetupQuestionDue: isSetupQuestionDue(memory.setup, setupNow),
      forgottenAt: forgottenSince(
        outing.fields,
        entries.map(({ fields }) => fields.deviceAt),
        minuteMs,
      ),
    };
  }, [outing, frame, allEntries, memory, checks, minuteMs, targets]);
}
