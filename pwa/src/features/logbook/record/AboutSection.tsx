import { formatChannel, channelOfKey } from '@harkmoor/sync-model/radio/bands/channel';
import { frequencyText } from '@harkmoor/sync-model/radio/bands/frequency-text';
import { Link } from 'react-router-dom';
import { Section } from '../../../design/layout/Section';
import { paths } from '../../../platform/paths';
import { utcDate, withUnit } from '../../../platform/utc-text';
import type { HeldReception } from '../data/held-reception';
import type { Derived } from './derive';
import { Facts } from './Facts';
import { BASIS_WORDS, evidenceWords, IDENTITY_WORDS, scheduleWords } from './reading-words';

/** What it was, what it counts for, and with what it was heard. */
export function AboutSection({ held, derived }: { readonly held: HeldReception; readonly derived: Derived }) {
  const { fields } = held.record;
  const { target } = held;
  const channel = channelOfKey(derived.channelKey);
  return (
    <Section title="What it was">
      <Facts
        facts={[
          { name: 'Evidence', value: evidenceWords(derived.evidence) },
          {
            name: 'Station',
            value: fields.stationName || target?.name || 'Unnamed',
            note: IDENTITY_WORDS[fields.identity],
          },
          target
            ? {
                name: 'Target',
                value: `${target.name}, ${frequencyText(fields.targetHz ?? target.frequencyHz)}`,
                note: scheduleWords(target, derived.time.atMs),
              }
            : fields.targetId !== null && { name: 'Target', value: 'Not on this device' },
          {
            name: 'Channel',
            value: channel ? formatChannel(channel) : derived.channelKey,
            note: derived.band ?? 'outside all bands of the region',
          },
          { name: 'Mode', value: fields.tuning.mode },
          fields.bandwidthHz !== null && { name: 'Bandwidth', value: withUnit(fields.bandwidthHz, 'Hz') },
          fields.durationS !== null && { name: 'Listened', value: withUnit(fields.durationS, 's') },
          {
            name: 'How',
            value: BASIS_WORDS[fields.basis],
            note: fields.roundNo === null ? undefined : `round ${fields.roundNo}`,
          },
        ]}
      />
    </Section>
  );
}

/** Receiver, antenna and what stood between; whose entry it is, and of which outing. */
export function WithSection({ held }: { readonly held: HeldReception }) {
  const { record, setup, receiver, antenna, outing } = held;
  const { fields } = record;
  const between = setup ? betweenWords(setup, fields.attenuationDb) : '';
  return (
    <Section title="With what, by whom">
      <Facts
        facts={[
          {
            name: 'Antenna',
            value:
              setup && antenna ? (
                <Link to={paths.antenna(setup.antennaId)}>{antenna.name}</Link>
              ) : (
                'Not on this device'
              ),
          },
          {
            name: 'Receiver',
            value:
              setup && receiver ? (
                <Link to={paths.receiver(setup.receiverId)}>{receiver.name}</Link>
              ) : (
                'Not on this device'
              ),
          },
          between !== '' && { name: 'Between them', value: between },
          {
            name: 'Operator',
            value: held.isOwn ? 'You' : ownerWords(held),
            note: fields.heardBy ? `heard by ${fields.heardBy}` : undefined,
          },
          outing !== null && {
            name: 'Outing',
            value: utcDate(outing.startedAt),
            note: outing.notes ?? undefined,
          },
        ]}
      />
    </Section>
  );
}

export function ownerWords({ record, names }: Pick<HeldReception, 'record' | 'names'>): string {
  return (record.ownerId && names('member', record.ownerId)) || 'A former member';
}

function betweenWords(
  { coupling, attenuationDb, preampDb }: NonNullable<HeldReception['setup']>,
  ownAttenuationDb: number | null,
): string {
  const attenuation = ownAttenuationDb ?? attenuationDb;
  return [
    coupling ?? '',
    attenuation > 0 ? `${withUnit(attenuation, 'dB')} attenuation` : '',
    preampDb > 0 ? `${withUnit(preampDb, 'dB')} preamplifier` : '',
  ]
    .filter((part) => part !== '')
    .join(', ');
}
