import { useGear } from './data/gear';
import { useFieldActions } from './data/use-field-actions';
import { SetupSheet } from './ui/SetupSheet';
import { useAct } from './use-act';
import type { RunningField } from './use-running-field';

/** The setup sheet of a running outing, with what it changes. */
export function SetupSheetOf({
  field,
  onClose,
}: {
  readonly field: RunningField;
  readonly onClose: () => void;
}) {
  const { outing, frame, roundNo, entries } = field;
  const actions = useFieldActions();
  const act = useAct();
  const gear = useGear() ?? [];
  const use = (setupId: string): void => {
    onClose();
    void act(() => actions.switchSetup(outing, setupId, { atMs: Date.now(), roundNo }));
  };
  const mend = (sinceMs: number, setupId: string): void => {
    onClose();
    void act(() => actions.mendSetup(outing, { sinceMs, setupId, nowMs: Date.now() }));
  };
  return (
    <SetupSheet
      taken={frame.setups}
      gear={gear}
      currentSetupId={outing.fields.currentSetupId}
      entries={entries}
      onUse={use}
      onMend={mend}
      onClose={onClose}
    />
  );
}
