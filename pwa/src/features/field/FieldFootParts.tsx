import { useIonRouter } from '@ionic/react';
import type { Hand } from '../../platform/hand';
import { buzz } from '../../platform/vibrate';
import { useFieldActions } from './data/use-field-actions';
import { OpenDraft } from './OpenDraft';
import { padForSameAgain } from './pad-paths';
import { ActLine } from './ui/ActLine';
import { FieldFoot } from './ui/FieldFoot';
import { SetupQuestion } from './ui/SetupQuestion';
import { useAct } from './use-act';
import type { RunningField } from './use-running-field';

type FieldFootPartsProps = {
  readonly field: RunningField;
  readonly hand: Hand;
  readonly onSetups: () => void;
};

/** The lower part of a running outing: the setup question, *Undo*, and the keys. */
export function FieldFootParts({ field, hand, onSetups }: FieldFootPartsProps) {
  const { outing, roundNo, round, frame, sameAgain } = field;
  const { currentSetupId } = outing.fields;
  const router = useIonRouter();
  const actions = useFieldActions();
  const act = useAct();
  const current = frame.setups.find(({ id }) => id === currentSetupId);
  const now = () => ({ atMs: Date.now(), roundNo });
  const again = (): void => {
    if (!sameAgain) return;
    buzz();
    const isWaiting = round.rows.some(
      ({ target, entry }) => entry === null && target.id === sameAgain.fields.targetId,
    );
    const waits = { inRound: isWaiting ? roundNo : null };
    router.push(padForSameAgain(sameAgain, waits, Date.now(), actions.newId()));
  };
  const lines = (
    <>
      <div className="fd-tall-only">
        <OpenDraft />
      </div>
      {field.isSetupQuestionDue && current ? (
        <SetupQuestion
          label={current.label}
          onYes={() => void act(() => actions.confirmSetup(outing.id, currentSetupId, now()))}
          onNo={onSetups}
        />
      ) : null}
      <ActLine
        act={field.lastAct}
        onUndo={(last) => void act(() => actions.undo(outing.id, last, Date.now()))}
      />
    </>
  );
  return (
    <div className="fd" data-hand={hand}>
      <FieldFoot
        line={lines}
        setups={frame.setups}
        currentSetupId={currentSetupId}
        onSetup={(id) => void act(() => actions.switchSetup(outing, id, now()))}
        onMoreSetups={onSetups}
        sameAgainHz={sameAgain?.fields.tuning.dialHz ?? null}
        onSameAgain={again}
      />
    </div>
  );
}
