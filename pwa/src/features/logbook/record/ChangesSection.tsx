import { useMemo, useState } from 'react';
import { Button } from '../../../design/button/Button';
import { Section } from '../../../design/layout/Section';
import { useSay } from '../../../design/notice/notices';
import { utcDateTime } from '../../../platform/utc-text';
import type { HeldReception } from '../data/held-reception';
import { useAllChanges } from '../data/use-all-changes';
import type { ReceptionActs } from '../data/use-reception-acts';
import { ClashMark } from '../list/RowState';
import { allChanges, changedAtMs, heldChanges, putBackPatch, type Change } from './changes';
import { fieldWords, valueWords } from './change-words';

type ChangesSectionProps = { readonly held: HeldReception; readonly acts: ReceptionActs };

/** Values that others replaced: nothing is lost, each can be read here and put back by its owner. */
export function ChangesSection({ held, acts }: ChangesSectionProps) {
  const { record, clashes, clubId, ownId } = held;
  const [all, readAll] = useAllChanges({ clubId, id: record.id, accountId: ownId });
  const changes = useMemo(() => {
    const here = heldChanges(record, clashes);
    return all.kind === 'read' ? allChanges(here, all.changes) : here;
  }, [record, clashes, all]);
  return (
    <Section title="Changes">
      {changes.length === 0 ? (
        <p className="soft">
          {all.kind === 'read' ? 'No value of it was ever replaced.' : 'No value met another one.'}
        </p>
      ) : (
        <ol className="log-changes">
          {changes.map((change) => (
            <ChangeLine key={change.id} change={change} held={held} acts={acts} />
          ))}
        </ol>
      )}
      {ownId === null ? (
        <p className="soft small">
          Replaced values are kept by the server, once this log belongs to an account.
        </p>
      ) : all.kind === 'read' ? null : (
        <>
          <Button look="quiet" busy={all.kind === 'asking'} onClick={readAll}>
            Read all changes
          </Button>
          <p className="soft small" role="status">
            {all.kind === 'failed'
              ? all.sentence
              : 'What met another value is on this device. The rest is read from the server, with signal.'}
          </p>
        </>
      )}
    </Section>
  );
}

type ChangeLineProps = ChangesSectionProps & { readonly change: Change };

function ChangeLine({ change, held, acts }: ChangeLineProps) {
  const { field, replaced, kept, byId, clash } = change;
  const { names } = held;
  const who = byId === held.ownId ? 'you' : (names('member', byId) ?? 'a former member');
  return (
    <li>
      <p className="log-change-field">
        {fieldWords(field)} {clash ? <ClashMark /> : null}
      </p>
      <p className="num">
        <s>{valueWords(field, replaced.value, names)}</s> became {valueWords(field, kept.value, names)}
      </p>
      <p className="soft small num">
        {utcDateTime(changedAtMs(change))}, by {who}
      </p>
      {held.isOwn ? <PutBackAct change={change} held={held} acts={acts} /> : null}
    </li>
  );
}

function PutBackAct({ change, held, acts }: ChangeLineProps) {
  const say = useSay();
  const [isBusy, setBusy] = useState(false);
  const back = putBackPatch(change, held.record);
  if (back.kind === 'refused') return <p className="soft small">{back.sentence}</p>;
  const name = fieldWords(change.field);
  const put = async (): Promise<void> => {
    setBusy(true);
    try {
      const before = (held.record.fields as Readonly<Record<string, unknown>>)[change.field];
      await acts.putBack(back.patch);
      say(`${name} put back`, { label: 'Undo', run: () => void acts.putBack({ [change.field]: before }) });
    } catch (error) {
      console.error('a value could not be put back', error);
      say(`${name} could not be put back. Free some space on this device and try again.`);
    } finally {
      setBusy(false);
    }
  };
  return (
    <Button
      look="quiet"
      busy={isBusy}
      aria-label={`Put back ${name}: ${valueWords(change.field, change.replaced.value, held.names)}`}
      onClick={() => void put()}
    >
      Put back
    </Button>
  );
}
