import { useOwnOutings, type StoredOuting } from './data/running-outing';
import { RunningScreen } from './RunningScreen';
import { StartScreen } from './StartScreen';
import { FieldFrame } from './ui/FieldFrame';
import { useRowsStill } from './use-rows-still';
import { useRunningField } from './use-running-field';

/** Field: the outing that runs, or the start of one. */
export function FieldPage() {
  const outings = useOwnOutings();
  return (
    <FieldFrame title="Field" hideTitle>
      {outings === undefined ? null : outings.running ? (
        <Running key={outings.running.id} outing={outings.running} />
      ) : (
        <StartScreen newest={outings.newest} />
      )}
    </FieldFrame>
  );
}

function Running({ outing }: { readonly outing: StoredOuting }) {
  const { areStill, touch } = useRowsStill();
  const field = useRunningField(outing, areStill);
  return field ? <RunningScreen field={field} areRowsStill={areStill} touchRows={touch} /> : null;
}
