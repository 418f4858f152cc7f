import { useEffect, useState } from 'react';
import { useHand } from '../../platform/hand';
import { holdWakeLock } from '../../platform/wake-lock';
import { useFieldActions } from './data/use-field-actions';
import { FieldFootParts } from './FieldFootParts';
import { RoundPart } from './RoundPart';
import { SetupSheetOf } from './SetupSheetOf';
import { OpenDraft } from './OpenDraft';
import { CautionLine } from './ui/Cautions';
import { ClockRow } from './ui/ClockRow';
import { ClockSheet } from './ui/ClockSheet';
import { EndSheet } from './ui/EndSheet';
import { InFoot } from './ui/FieldFrame';
import { ForgottenPanel } from './ui/ForgottenPanel';
import { SiteLine } from './ui/OutingHead';
import { RainLock, useRainLock } from './ui/RainLock';
import { useAct } from './use-act';
import { useClockWatch } from './use-clock-watch';
import { useNextRowInView } from './use-next-row-in-view';
import type { RunningField } from './use-running-field';

type RunningScreenProps = {
  readonly field: RunningField;
  readonly areRowsStill: boolean;
  readonly touchRows: () => void;
};

/** A running outing: clock and sun, the round, and what the thumb needs below it. */
export function RunningScreen({ field, areRowsStill, touchRows }: RunningScreenProps) {
  const { outing, frame, minuteMs } = field;
  const actions = useFieldActions();
  const act = useAct();
  const hand = useHand();
  const rain = useRainLock();
  const [sheet, setSheet] = useState<'clock' | 'setups' | 'end' | null>(null);
  const close = (): void => setSheet(null);
  const end = (atMs: number, by: 'hand' | 'gap'): void => {
    close();
    void act(() => actions.endOuting(outing, atMs, by));
  };
  useEffect(holdWakeLock, []);
  useClockWatch((step) => void act(() => actions.noteClockStep(outing, step)));
  useNextRowInView(areRowsStill, field.roundNo);
  return (
    <div className="fd" data-hand={hand}>
      <ClockRow
        trust={field.trust}
        minuteMs={minuteMs}
        trueMs={field.trueMs}
        position={frame.position}
        onCheck={() => setSheet('clock')}
      />
      <SiteLine field={field} onLock={rain.lock} />
      {field.forgottenAt === null ? null : (
        <ForgottenPanel endedAt={field.forgottenAt} nowMs={minuteMs} onEnd={(at) => end(at, 'gap')} />
      )}
      {field.memory.cautionsRead ? null : (
        <CautionLine onRead={() => void act(() => actions.readCautions(outing.id))} />
      )}
      <div className="fd-short-only">
        <OpenDraft />
      </div>
      <RoundPart field={field} touchRows={touchRows} onEnd={() => setSheet('end')} />
      <InFoot>
        <FieldFootParts field={field} hand={hand} onSetups={() => setSheet('setups')} />
      </InFoot>
      {sheet === 'clock' ? <ClockSheet trust={field.trust} nowMs={minuteMs} onClose={close} /> : null}
      {sheet === 'setups' ? <SetupSheetOf field={field} onClose={close} /> : null}
      {sheet === 'end' ? (
        <EndSheet
          lastEntryAt={lastEntryAt(field)}
          nowMs={minuteMs}
          onEnd={(at) => end(at, 'hand')}
          onClose={close}
        />
      ) : null}
      {rain.isLocked ? <RainLock onOpen={rain.unlock} /> : null}
    </div>
  );
}

function lastEntryAt({ entries }: RunningField): number | null {
  return entries.length === 0 ? null : Math.max(...entries.map(({ fields }) => fields.deviceAt));
}
