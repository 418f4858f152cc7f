import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { Button } from '../../../design/button/Button';
import { ButtonLink } from '../../../design/button/ButtonLink';
import { paths } from '../../../platform/paths';
import type { StoredOuting } from '../data/running-outing';
import { useTargetLists } from '../data/target-lists';
import { useFieldActions } from '../data/use-field-actions';
import { useAct } from '../use-act';

type ListChoiceProps = {
  readonly outing: StoredOuting;
  readonly list: StoredRecord<'target-list'> | null;
};

/** Stands where the rows would be: choose a list, or enter frequencies below. */
export function ListChoice({ outing, list }: ListChoiceProps) {
  const actions = useFieldActions();
  const act = useAct();
  const lists = useTargetLists() ?? [];
  return (
    <section className="fd-no-list">
      <h2>{list ? `${list.fields.name} is empty` : 'No target list'}</h2>
      <p>Enter any frequency below. With a target list, each station waits here with Nil and Heard.</p>
      <div className="fd-sheet-list">
        {lists
          .filter(({ id, targetCount }) => id !== list?.id && targetCount > 0)
          .map(({ id, name, targetCount }) => (
            <Button key={id} look="outline" onClick={() => void act(() => actions.changeList(outing, id))}>
              {name} · {targetCount} {targetCount === 1 ? 'target' : 'targets'}
            </Button>
          ))}
        <ButtonLink to={paths.targetLists()} look="quiet">
          Make or import a list
        </ButtonLink>
      </div>
    </section>
  );
}
