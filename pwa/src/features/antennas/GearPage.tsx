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
  return (
    <>
      {isEmpty ? (
        <EmptyState
          title="No gear yet"
          sentence="Add a receiver and an antenna; together they make a setup, and each entry says with which it was heard."
        />
      ) : null}
      <Section
        title="Setups"
        aside={
          isEmpty ? null : (
            <ButtonLink to={paths.newSetup()} look="quiet">
              Add a setup
            </ButtonLink>
          )
        }
      >
        {ownFirst(gear)
          .filter(({ setup }) => setup.fields.retiredAt === null)
          .map((row) => (
            <RowLink
              key={row.setup.id}
              to={paths.setup(row.setup.id)}
              name={setupName(row)}
              note={joined(setupNote(row.setup.fields), ownerNote(gear, row.setup))}
            />
          ))}
      </Section>
      <Section
        title="Antennas"
        aside={
          <ButtonLink to={paths.newAntenna()} look="quiet">
            Add an antenna
          </ButtonLink>
        }
      >
        {gear.antennas
          .filter((row) => row.fields.retiredAt === null)
          .map((row) => (
            <RowLink
              key={row.id}
              to={paths.antenna(row.id)}
              name={row.fields.name}
              note={joined(antennaNote(row.fields), ownerNote(gear, row))}
            />
          ))}
      </Section>
      <Section
        title="Receivers"
        aside={
          <ButtonLink to={paths.newReceiver()} look="quiet">
            Add a receiver
          </ButtonLink>
        }
      >
        {gear.receivers
          .filter((row) => row.fields.retiredAt === null)
          .map((row) => (
            <RowLink
              key={row.id}
              to={paths.receiver(row.id)}
              name={row.fields.name}
              note={joined(receiverNote(row.fields), ownerNote(gear, row))}
            />
          ))}
      </Section>
      <Retired gear={gear} />
    </>
  );
}

function Retired({ gear }: { readonly gear: Gear }) {
  const antennas = gear.antennas.filter((row) => row.fields.retiredAt !== null);
  const receivers = gear.receivers.filter((row) => row.fields.retiredAt !== null);
  const setups = gear.setups.filter(({ setup }) => setup.fields.retiredAt !== null);
  if (antennas.length + receivers.length + setups.length === 0) return null;
  return (
    <Section title="Retired">
      {antennas.map((row) => (
        <RowLink
          key={row.id}
          to={paths.antenna(row.id)}
          name={row.fields.name}
          note="Antenna; its evidence stays"
        />
      ))}
      {receivers.map((row) => (
        <RowLink
          key={row.id}
          to={paths.receiver(row.id)}
          name={row.fields.name}
          note="Receiver; its evidence stays"
        />
      ))}
      {setups.map((row) => (
        <RowLink
          key={row.setup.id}
          to={paths.setup(row.setup.id)}
          name={setupName(row)}
          note="Setup; its evidence stays"
        />
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
