import { ButtonLink } from '../../design/button/ButtonLink';
import { RowLink } from '../../design/layout/RowLink';
import { Section } from '../../design/layout/Section';
import { PageFrame } from '../../design/page/PageFrame';
import { EmptyState } from '../../design/states/EmptyState';
import { paths } from '../../platform/paths';
import { isOwn, useGear, type Gear } from './data/gear';
import { antennaNote, receiverNote, setupName, setupNote } from './gear-words';

/** The club's receivers, antennas and setups. */
export function GearPage() {
  const gear = useGear();
  return <PageFrame title="Antennas">{gear ? <GearLists gear={gear} /> : null}</PageFrame>;
}

function GearLists({ gear }: { readonly gear: Gear }) {
  const isEmpty = gear.receivers.length + gear.antennas.length === 0;
  const setups: GearLine[] = ownFirst(gear).map((row) => ({
    to: paths.setup(row.setup.id),
    name: setupName(row),
    note: joined(setupNote(row.setup.fields), ownerNote(gear, row.setup)),
    isRetired: row.setup.fields.retiredAt !== null,
  }));
  const antennas: GearLine[] = gear.antennas.map((row) => ({
    to: paths.antenna(row.id),
    name: row.fields.name,
    note: joined(antennaNote(row.fields), ownerNote(gear, row)),
    isRetired: row.fields.retiredAt !== null,
  }));
  const receivers: GearLine[] = gear.receivers.map((row) => ({
    to: paths.receiver(row.id),
    name: row.fields.name,
    note: joined(receiverNote(row.fields), ownerNote(gear, row)),
    isRetired: row.fields.retiredAt !== null,
  }));
  return (
    <>
      {isEmpty ? (
        <EmptyState
          title="No gear yet"
          sentence="Add a receiver and an antenna; together they make a setup, and each entry says with which it was heard."
        />
      ) : null}
      <GearList
        title="Setups"
        add={isEmpty ? null : { to: paths.newSetup(), label: 'Add a setup' }}
        lines={setups}
      />
      <GearList title="Antennas" add={{ to: paths.newAntenna(), label: 'Add an antenna' }} lines={antennas} />
      <GearList
        title="Receivers"
        add={{ to: paths.newReceiver(), label: 'Add a receiver' }}
        lines={receivers}
      />
      <Retired lines={[...setups, ...antennas, ...receivers].filter((line) => line.isRetired)} />
    </>
  );
}

type GearLine = {
  readonly to: string;
  readonly name: string;
  readonly note: string;
  readonly isRetired: boolean;
};

type GearListProps = {
  readonly title: string;
  readonly add: { readonly to: string; readonly label: string } | null;
  readonly lines: readonly GearLine[];
};

function GearList({ title, add, lines }: GearListProps) {
  return (
    <Section
      title={title}
      aside={
        add ? (
          <ButtonLink to={add.to} look="quiet">
            {add.label}
          </ButtonLink>
        ) : null
      }
    >
      {lines
        .filter((line) => !line.isRetired)
        .map(({ to, name, note }) => (
          <RowLink key={to} to={to} name={name} note={note} />
        ))}
    </Section>
  );
}

function Retired({ lines }: { readonly lines: readonly GearLine[] }) {
  if (lines.length === 0) return null;
  return (
    <Section title="Retired">
      {lines.map(({ to, name }) => (
        <RowLink key={to} to={to} name={name} note="Its evidence stays" />
      ))}
    </Section>
  );
}

/** Names are not unique: others' gear is shown with its owner. */
function ownerNote(gear: Gear, record: { ownerId: string | null }): string {
  if (isOwn(gear.log, record)) return '';
  return `${gear.ownerNames.get(record.ownerId ?? '') ?? 'former member'}’s`;
}

function joined(...parts: readonly string[]): string {
  return parts.filter((part) => part !== '').join(' · ');
}

/** One's own setups first, by name; then those of others. */
function ownFirst(gear: Gear): Gear['setups'] {
  return [...gear.setups].sort(
    (a, b) =>
      Number(isOwn(gear.log, b.setup)) - Number(isOwn(gear.log, a.setup)) ||
      setupName(a).localeCompare(setupName(b)),
  );
}
