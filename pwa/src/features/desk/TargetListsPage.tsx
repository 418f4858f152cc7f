import { useIonRouter } from '@ionic/react';
import { targetListSchema } from '@harkmoor/sync-model/records/target-list';
import { useState, type FormEvent } from 'react';
import { Button } from '../../design/button/Button';
import { ErrorSummary } from '../../design/form/ErrorSummary';
import { TextField } from '../../design/form/TextField';
import { useFormErrors } from '../../design/form/use-form-errors';
import { RowLink } from '../../design/layout/RowLink';
import { PageFrame } from '../../design/page/PageFrame';
import { Sheet } from '../../design/sheet/Sheet';
import { EmptyState } from '../../design/states/EmptyState';
import { paths } from '../../platform/paths';
import { schemaFaults } from '../../platform/schema-faults';
import { useListActs, useTargetLists, type ListRow } from './data/target-lists';

/** What the club listens for: published lists and one's own drafts. */
export function TargetListsPage() {
  const lists = useTargetLists();
  const [isMaking, setMaking] = useState(false);
  return (
    <PageFrame
      title="Target lists"
      back={{ to: paths.account(), label: 'Account' }}
      actions={
        <Button look="quiet" onClick={() => setMaking(true)}>
          Add a list
        </Button>
      }
    >
      {lists?.length === 0 ? (
        <EmptyState
          title="No target lists yet"
          sentence="A list names the transmissions worth listening for; an outing goes through it in rounds. Type it, or import it from a spreadsheet."
          action={<Button onClick={() => setMaking(true)}>Add a list</Button>}
        />
      ) : null}
      {lists?.map((row) => (
        <RowLink
          key={row.list.id}
          to={paths.targetList(row.list.id)}
          name={row.list.fields.name}
          note={listNote(row)}
        />
      ))}
      <Sheet isOpen={isMaking} title="New target list" onClose={() => setMaking(false)}>
        <NewListForm />
      </Sheet>
    </PageFrame>
  );
}

function listNote({ list, targets }: ListRow): string {
  const parts = [
    list.fields.publishedAt === null ? 'Draft' : 'Published',
    targets === 1 ? '1 target' : `${targets} targets`,
  ];
  if (list.fields.edition) parts.push(list.fields.edition);
  return parts.join(' · ');
}

function NewListForm() {
  const router = useIonRouter();
  const acts = useListActs();
  const errors = useFormErrors();
  const [name, setName] = useState('');
  const [edition, setEdition] = useState('');

  async function submit(event: FormEvent): Promise<void> {
    event.preventDefault();
    const values = {
      name: name.trim().normalize('NFC'),
      edition: edition.trim() === '' ? null : edition.trim().normalize('NFC'),
    };
    if (!errors.report(schemaFaults(targetListSchema.pick({ name: true, edition: true }), values))) return;
    router.push(paths.targetList(await acts.make(values)));
  }
  return (
    <form ref={errors.ref} noValidate onSubmit={(event) => void submit(event)}>
      <TextField
        {...errors.field('name')}
        label="Name"
        required
        maxLength={60}
        value={name}
        onChange={setName}
      />
      <TextField
        {...errors.field('edition')}
        label="Edition"
        hint="For example Winter 2026"
        maxLength={40}
        value={edition}
        onChange={setEdition}
      />
      <ErrorSummary form={errors} />
      <Button type="submit" wide>
        Make the list
      </Button>
    </form>
  );
}
