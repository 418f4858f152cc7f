import { ROLES, type Role } from '@harkmoor/sync-model/records/member';
import { useState } from 'react';
import { Button } from '../../design/button/Button';
import { Section } from '../../design/layout/Section';
import { NoticeLine } from '../../design/notice/NoticeLine';
import { PageFrame } from '../../design/page/PageFrame';
import { Sheet } from '../../design/sheet/Sheet';
import { EmptyState } from '../../design/states/EmptyState';
import { DataTable, type Column } from '../../design/table/DataTable';
import { answerWords } from '../../platform/api/answer-words';
import { paths } from '../../platform/paths';
import { useSending } from '../../platform/sending';
import { utcDate } from '../../platform/utc-text';
import { changeRole, usePeople, type People, type PersonRow } from './data/use-people';
import { JoinCodePart } from './JoinCodePart';
import './desk.css';

const ROLE_WORDS: Record<Role, string> = { member: 'Member', organizer: 'Organizer', admin: 'Admin' };
const ROLE_NOTES: Record<Role, string> = {
  member: 'Member: logs and sees',
  organizer: 'Organizer: also publishes target lists',
  admin: 'Admin: also manages people',
};

/** Who is in the club, with which role; admins change roles and give out the join code. */
export function PeoplePage() {
  const people = usePeople();
  return (
    <PageFrame
      title="People"
      subtitle={people?.log.card.name}
      back={{ to: paths.account(), label: 'Account' }}
      wide
    >
      {people ? people.log.card.kind === 'my-log' ? <OwnLog /> : <ClubPeople people={people} /> : null}
    </PageFrame>
  );
}

function OwnLog() {
  return (
    <EmptyState
      title="My log is yours alone"
      sentence="Nobody else is in it, and nobody else sees it. A club has people: choose or join one on the account page."
    />
  );
}

function ClubPeople({ people }: { readonly people: People }) {
  const { log, rows } = people;
  const { sendNow } = useSending();
  const [notice, setNotice] = useState<string | null>(null);
  const [asked, setAsked] = useState<PersonRow | null>(null);
  const isAdmin = log.role === 'admin';

  async function give(person: PersonRow, role: Role): Promise<void> {
    setAsked(null);
    const answer = await changeRole(log, person.accountId, role);
    setNotice(
      answer.kind === 'ok' ? `${person.name} is now ${ROLE_WORDS[role].toLowerCase()}.` : answerWords(answer),
    );
    if (answer.kind === 'ok') sendNow();
  }
  return (
    <>
      <NoticeLine text={notice} />
      {rows.length === 0 ? (
        <EmptyState
          title="Not received yet"
          sentence="The members come with the next round, once there is signal."
          action={<Button onClick={sendNow}>Ask now</Button>}
        />
      ) : (
        <DataTable
          caption="Members of the club"
          columns={columnsOf(isAdmin, setAsked)}
          rows={rows}
          rowKey={(row) => row.accountId}
        />
      )}
      <RoleSheet
        asked={asked}
        onGive={(person, role) => void give(person, role)}
        onClose={() => setAsked(null)}
      />
      {isAdmin ? (
        <Section title="Invite by code">
          <JoinCodePart log={log} />
        </Section>
      ) : null}
    </>
  );
}

type RoleSheetProps = {
  readonly asked: PersonRow | null;
  readonly onGive: (person: PersonRow, role: Role) => void;
  readonly onClose: () => void;
};

function RoleSheet({ asked, onGive, onClose }: RoleSheetProps) {
  return (
    <Sheet isOpen={asked !== null} title={`Role of ${asked?.name ?? ''}`} onClose={onClose}>
      {ROLES.map((role) => (
        <Button
          key={role}
          wide
          look={asked?.role === role ? 'primary' : 'outline'}
          onClick={() => asked && onGive(asked, role)}
        >
          {ROLE_NOTES[role]}
        </Button>
      ))}
    </Sheet>
  );
}

function columnsOf(isAdmin: boolean, onAsk: (row: PersonRow) => void): Column<PersonRow>[] {
  return [
    {
      key: 'name',
      header: 'Name',
      cell: (row) => (row.isMe ? `${row.name} (you)` : row.name),
      sortBy: (row) => row.name,
    },
    {
      key: 'role',
      header: 'Role',
      sortBy: (row) => ROLES.indexOf(row.role),
      cell: (row) =>
        row.leftAt !== null ? (
          'Former member'
        ) : isAdmin ? (
          <span className="desk-cell-button">
            <Button
              look="quiet"
              aria-label={`Change the role of ${row.name}: ${ROLE_WORDS[row.role]}`}
              onClick={() => onAsk(row)}
            >
              {ROLE_WORDS[row.role]}
            </Button>
          </span>
        ) : (
          ROLE_WORDS[row.role]
        ),
    },
    {
      key: 'joined',
      header: 'Since',
      figures: true,
      cell: (row) => utcDate(row.joinedAt),
      sortBy: (row) => row.joinedAt,
    },
  ];
}
