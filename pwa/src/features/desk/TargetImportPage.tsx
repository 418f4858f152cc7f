import { useIonRouter } from '@ionic/react';
import { useState } from 'react';
import { useParams } from 'react-router-dom';
import { Button } from '../../design/button/Button';
import { Section } from '../../design/layout/Section';
import { PageFrame } from '../../design/page/PageFrame';
import { EmptyState } from '../../design/states/EmptyState';
import { paths } from '../../platform/paths';
import { useListActs, useTargetList } from './data/target-lists';
import { ColumnChoice } from './target-import/ColumnChoice';
import { FilePart } from './target-import/FilePart';
import { FaultList, TargetPreview } from './target-import/ImportPreview';
import { readTargets } from './target-import/read-targets';
import type { ColumnMeaning } from './target-import/target-columns';
import type { TableFile } from './target-import/table-file';

/** Imports targets from CSV: columns matched by hand, looked at before, all taken or none. */
export function TargetImportPage() {
  const { id } = useParams();
  const view = useTargetList(id);
  const back = { to: id ? paths.targetList(id) : paths.targetLists(), label: 'Target list' };
  return (
    <PageFrame title="Import targets" subtitle={view?.list.fields.name} back={back} wide>
      {view === null || view?.mayEdit === false ? (
        <EmptyState
          title="Nothing can be imported here"
          sentence="The list is not on this phone, or it is published and changed by organizers."
        />
      ) : view ? (
        <ImportSteps listId={view.list.id} />
      ) : null}
    </PageFrame>
  );
}

type Chosen = { readonly file: TableFile; readonly meanings: readonly ColumnMeaning[] };

function ImportSteps({ listId }: { readonly listId: string }) {
  const acts = useListActs();
  const router = useIonRouter();
  const [chosen, setChosen] = useState<Chosen | null>(null);
  const [isBusy, setBusy] = useState(false);
  if (!chosen) return <FilePart onFile={(file, meanings) => setChosen({ file, meanings })} />;

  const { file, meanings } = chosen;
  const read = readTargets(file.rows, meanings, file.firstRow);
  async function take(): Promise<void> {
    setBusy(true);
    await acts.importTargets(listId, read.targets);
    router.push(paths.targetList(listId), 'back', 'pop');
  }
  return (
    <>
      <Section title={`${file.name}: ${read.rows} rows`}>
        <ColumnChoice
          file={file}
          meanings={meanings}
          onMeanings={(next) => setChosen({ file, meanings: next })}
        />
      </Section>
      {read.faults.length > 0 ? <FaultList faults={read.faults} /> : <TargetPreview targets={read.targets} />}
      <Button
        wide
        busy={isBusy}
        disabled={read.faults.length > 0 || read.targets.length === 0}
        onClick={() => void take()}
      >
        {read.faults.length > 0
          ? 'Nothing is imported while there are faults'
          : `Import ${read.targets.length} targets`}
      </Button>
      <Button look="quiet" onClick={() => setChosen(null)}>
        Choose another file
      </Button>
    </>
  );
}
