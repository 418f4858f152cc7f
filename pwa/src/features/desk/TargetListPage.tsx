import { useIonRouter } from '@ionic/react';
import { frequencyText } from '@harkmoor/sync-model/radio/bands/frequency-text';
import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { useState } from 'react';
import { useParams } from 'react-router-dom';
import { Button } from '../../design/button/Button';
import { ButtonLink } from '../../design/button/ButtonLink';
import { PageFrame } from '../../design/page/PageFrame';
import { ConfirmSheet } from '../../design/sheet/ConfirmSheet';
import { Sheet } from '../../design/sheet/Sheet';
import { EmptyState } from '../../design/states/EmptyState';
import { DataTable, type Column } from '../../design/table/DataTable';
import { paths } from '../../platform/paths';
import { useListActs, useTargetList, type ListView } from './data/target-lists';
import { scheduleText } from './targets/schedule-text';
import { TargetForm } from './targets/TargetForm';
import './desk.css';

const BACK = { to: paths.targetLists(), label: 'Target lists' };
type TargetRow = StoredRecord<'target'>;

/** One list with its targets: edited, imported into and published by those who may. */
export function TargetListPage() {
  const { id } = useParams();
  const view = useTargetList(id);
  if (view === undefined)
    return (
      <PageFrame title="Target list" back={BACK}>
        {null}
      </PageFrame>
    );
  if (view === null) {
    return (
      <PageFrame title="No such list" back={BACK}>
        <EmptyState
          title="This phone holds no such list"
          sentence="It may be in another club, or not received yet."
        />
      </PageFrame>
    );
  }
  const { name, edition, publishedAt } = view.list.fields;
  const state = publishedAt === null ? 'Draft' : 'Published';
  return (
    <PageFrame title={name} subtitle={edition ? `${state} · ${edition}` : state} back={BACK} wide>
      <ListBody view={view} />
    </PageFrame>
  );
}

function ListBody({ view }: { readonly view: ListView }) {
  const acts = useListActs();
  const [edited, setEdited] = useState<TargetRow | 'new' | null>(null);
  return (
    <>
      {view.mayEdit ? (
        <ListActs view={view} onAdd={() => setEdited('new')} />
      ) : (
        <p className="desk-soft">Published lists are changed by organizers.</p>
      )}
      {view.targets.length === 0 ? (
        <EmptyState
          title="No targets yet"
          sentence="Add them one by one, or import a table from a spreadsheet as CSV."
        />
      ) : (
        <DataTable
          caption={`Targets of ${view.list.fields.name}`}
          columns={columnsOf(view, setEdited)}
          rows={view.targets}
          rowKey={(row) => row.id}
        />
      )}
      <Sheet
        isOpen={edited !== null}
        title={edited === 'new' ? 'New target' : 'Target'}
        onClose={() => setEdited(null)}
      >
        {edited !== null ? (
          <TargetForm
            listId={view.list.id}
            target={edited === 'new' ? null : edited.fields}
            onSave={async (target) => {
              await acts.saveTarget(edited === 'new' ? null : edited.id, target);
              setEdited(null);
            }}
            onRemove={
              edited === 'new'
                ? undefined
                : async () => {
                    await acts.removeTarget(edited.id);
                    setEdited(null);
                  }
            }
          />
        ) : null}
      </Sheet>
    </>
  );
}

function columnsOf(view: ListView, edit: (row: TargetRow) => void): Column<TargetRow>[] {
  return [
    {
      key: 'frequency',
      header: 'Frequency',
      figures: true,
      cell: (row) => frequencyText(row.fields.frequencyHz),
      sortBy: (row) => row.fields.frequencyHz,
    },
    {
      key: 'name',
      header: 'Name',
      sortBy: (row) => row.fields.name,
      cell: (row) =>
        view.mayEdit ? (
          <span className="desk-cell-button">
            <Button look="quiet" onClick={() => edit(row)}>
              {row.fields.name}
            </Button>
          </span>
        ) : (
          row.fields.name
        ),
    },
    { key: 'mode', header: 'Mode', cell: (row) => row.fields.mode },
    { key: 'schedule', header: 'On air, UTC', cell: (row) => scheduleText(row.fields.schedule) },
  ];
}

function ListActs({ view, onAdd }: { readonly view: ListView; readonly onAdd: () => void }) {
  const acts = useListActs();
  const router = useIonRouter();
  const [isRemoving, setRemoving] = useState(false);
  const { id } = view.list;
  return (
    <div className="desk-acts">
      <Button onClick={onAdd}>Add a target</Button>
      <ButtonLink look="outline" to={paths.targetListImport(id)}>
        Import from CSV
      </ButtonLink>
      {view.mayPublish && view.list.fields.publishedAt === null && view.targets.length > 0 ? (
        <Button look="outline" onClick={() => void acts.publish(id, Date.now())}>
          Publish for the club
        </Button>
      ) : null}
      <Button look="quiet" onClick={() => setRemoving(true)}>
        Remove the list
      </Button>
      <ConfirmSheet
        isOpen={isRemoving}
        title={`Remove “${view.list.fields.name}”?`}
        confirmLabel="Remove the list"
        danger
        onClose={() => setRemoving(false)}
        onConfirm={() => void acts.remove(view).then(() => router.push(paths.targetLists(), 'back', 'pop'))}
      >
        <p>
          The list and its {view.targets.length} targets go to the bin. What was logged for them stays in the
          logbook, but counts no more in the rates of these targets.
        </p>
      </ConfirmSheet>
    </div>
  );
}
