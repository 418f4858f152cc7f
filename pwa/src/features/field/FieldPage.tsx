import { PageFrame } from '../../design/page/PageFrame';
import { useOwnOutings, type StoredOuting } from './data/running-outing';
import { RunningScreen } from './RunningScreen';
import { StartScreen } from './StartScreen';
import { useRowsStill } from './use-rows-still';
import { useRunningField } from './use-running-field';

/** Field: the outing that runs, or the start of one. */
export function FieldPage() {
  const outings = useOwnOutings();
  if (outings === undefined) return <Empty />;
  return outings.running ? (
    <Running key={outings.running.id} outing={outings.running} />
  ) : (
    <StartScreen newest={outings.newest} />
  );
}

function Running({ outing }: { readonly outing: StoredOuting }) {
  const { areStill, touch } = useRowsStill();
  const field = useRunningField(outing, areStill);
  return field ? <RunningScreen field={field} areRowsStill={areStill} touchRows={touch} /> : <Empty />;
}

function Empty() {
  return (
    <PageFrame title="Field" hideTitle>
      {null}
    </PageFrame>
  );
}
