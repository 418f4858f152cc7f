import { useIonRouter } from '@ionic/react';
import { useOpenDrafts } from './data/pad-drafts';
import { useFieldActions } from './data/use-field-actions';
import { DraftLine } from './ui/DraftLine';
import { useAct } from './use-act';

/** The newest pad that was left before *Save*, offered until it is taken up or discarded. */
export function OpenDraft() {
  const router = useIonRouter();
  const actions = useFieldActions();
  const act = useAct();
  const draft = useOpenDrafts()?.[0];
  if (!draft) return null;
  return (
    <DraftLine
      draft={draft}
      onContinue={() => router.push(draft.values.path)}
      onDrop={() => void act(() => actions.dropDraft(draft.values.receptionId))}
    />
  );
}
