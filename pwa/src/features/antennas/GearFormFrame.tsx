import { useIonRouter } from '@ionic/react';
import { useEffect, useState, type FormEvent, type ReactNode } from 'react';
import { Button } from '../../design/button/Button';
import { ErrorSummary } from '../../design/form/ErrorSummary';
import type { FormErrors } from '../../design/form/use-form-errors';
import { ConfirmSheet } from '../../design/sheet/ConfirmSheet';
import { Sheet } from '../../design/sheet/Sheet';
import { paths } from '../../platform/paths';
import { registerUnsavedWork } from '../../platform/unsaved-work';

type GearFormFrameProps = {
  readonly errors: FormErrors;
  readonly isDirty: boolean;
  /** Existing gear that receptions refer to: a change asks whether it corrects or replaces. */
  readonly asksHow: boolean;
  readonly isRetired: boolean;
  /** Absent for a new piece. */
  readonly onPutAway?: () => Promise<unknown>;
  readonly onTakeBack?: () => Promise<unknown>;
  /** False where the form has faults: nothing was saved. */
  readonly onSave: (how: 'correct' | 'replace') => Promise<boolean>;
  readonly isFaulty: () => boolean;
  readonly children: ReactNode;
};

/** The form of a piece of gear: save, and for an existing one put away, take back, and the question how it changed. */
export function GearFormFrame(props: GearFormFrameProps) {
  const router = useIonRouter();
  const [isAskingHow, setAskingHow] = useState(false);
  const [isPuttingAway, setPuttingAway] = useState(false);
  const { isDirty } = props;
  useEffect(() => (isDirty ? registerUnsavedWork() : undefined), [isDirty]);
  const leave = () => router.push(paths.antennas(), 'back', 'pop');

  async function save(how: 'correct' | 'replace'): Promise<void> {
    setAskingHow(false);
    if (await props.onSave(how)) leave();
  }
  function submit(event: FormEvent): void {
    event.preventDefault();
    if (props.isFaulty()) return;
    if (props.asksHow && isDirty) setAskingHow(true);
    else void save('correct');
  }
  return (
    <form ref={props.errors.ref} onSubmit={submit} noValidate>
      {props.children}
      <ErrorSummary form={props.errors} />
      <Button type="submit" wide>
        Save
      </Button>
      {props.isRetired && props.onTakeBack ? (
        <Button look="outline" onClick={() => void props.onTakeBack?.().then(leave)}>
          Use it again
        </Button>
      ) : props.onPutAway ? (
        <Button look="danger" onClick={() => setPuttingAway(true)}>
          Put away
        </Button>
      ) : null}
      <Sheet isOpen={isAskingHow} title="How has it changed?" onClose={() => setAskingHow(false)}>
        <p>Receptions were logged with it.</p>
        <Button wide onClick={() => void save('correct')}>
          Correct a mistake: past receptions follow
        </Button>
        <Button wide look="outline" onClick={() => void save('replace')}>
          It has changed: a new one from now
        </Button>
      </Sheet>
      <ConfirmSheet
        isOpen={isPuttingAway}
        title="Put it away?"
        confirmLabel="Put away"
        onConfirm={() => void props.onPutAway?.().then(leave)}
        onClose={() => setPuttingAway(false)}
      >
        <p>
          What was logged with it stays as evidence, and it can be used again later. Gear that nothing was
          logged with goes to the bin.
        </p>
      </ConfirmSheet>
    </form>
  );
}
