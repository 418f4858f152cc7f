import { ANTENNA_KIND_WORDS, type AntennaKindName } from '../view/antenna-kinds';
import type { AntennaChoice, Measure, Subject } from '../view/coverage-view';
import { shownSubject } from '../view/evidence-filters';
import { MEASURE_WORDS } from '../view/scope-words';
import type { ChoicesProps } from './FilterSheets';
import { OptionList, type Choice } from './OptionList';

/** Any frequency, a band (its rate is the mean of its channels) or a channel, the most tried first. */
export function SubjectChoices({ view, overview, onChange }: ChoicesProps) {
  const subject = shownSubject(view, overview);
  const chosen = subject.kind === 'any' ? 'any' : `${subject.kind}:${subject.key}`;
  const list = { name: 'subject', chosen, onChoose: (next: Subject) => onChange({ subject: next }) };
  return (
    <>
      <OptionList
        {...list}
        legend="All"
        hideLegend
        choices={[
          {
            key: 'any',
            label: 'Any frequency, mean of its channels',
            n: overview.observations,
            value: { kind: 'any' },
          },
        ]}
      />
      <OptionList
        {...list}
        legend="Bands, mean of their channels"
        choices={overview.bands.map(({ key, label, n }): Choice<Subject> => ({
          key: `band:${key}`,
          label,
          n,
          value: { kind: 'band', key },
        }))}
      />
      <OptionList
        {...list}
        legend="Channels, most tried first"
        choices={overview.channels.map(({ key, label, n }): Choice<Subject> => ({
          key: `channel:${key}`,
          label,
          n,
          value: { kind: 'channel', key },
        }))}
      />
    </>
  );
}

const MEASURES: readonly { key: Measure; note: string }[] = [
  { key: 'rate', note: 'heard among tries' },
  { key: 'score', note: 'median O of what was heard' },
  { key: 'count', note: 'how much stands behind' },
];

export function MeasureChoices({ view, onChange }: ChoicesProps) {
  return (
    <OptionList
      legend="The map shows"
      hideLegend
      name="measure"
      chosen={view.measure}
      onChoose={(measure) => onChange({ measure })}
      choices={MEASURES.map(({ key, note }) => ({
        key,
        label: `${MEASURE_WORDS[key]}: ${note}`,
        value: key,
      }))}
    />
  );
}

export function AntennaChoices({ view, overview, onChange }: ChoicesProps) {
  const { antenna } = view;
  const chosen =
    antenna.kind === 'any' ? 'any' : antenna.kind === 'kind' ? antenna.antennaKind : antenna.antennaId;
  const kinds = new Map<AntennaKindName, number>();
  for (const { antennaKind, n } of overview.antennas)
    kinds.set(antennaKind, (kinds.get(antennaKind) ?? 0) + n);
  const list = {
    name: 'antenna',
    chosen,
    onChoose: (next: AntennaChoice) => onChange({ antenna: next }),
  };
  return (
    <>
      <OptionList
        {...list}
        legend="Any antenna, or one kind"
        hideLegend
        choices={[
          { key: 'any', label: 'Any antenna', n: overview.observations, value: { kind: 'any' } },
          ...[...kinds].map(([antennaKind, n]): Choice<AntennaChoice> => ({
            key: antennaKind,
            label: ANTENNA_KIND_WORDS[antennaKind],
            n,
            value: { kind: 'kind', antennaKind },
          })),
        ]}
      />
      <OptionList
        {...list}
        legend="One antenna"
        choices={overview.antennas.map(({ key, label, n }): Choice<AntennaChoice> => ({
          key,
          label,
          n,
          value: { kind: 'one', antennaId: key },
        }))}
      />
    </>
  );
}

export function SetupChoices({ view, overview, onChange }: ChoicesProps) {
  return (
    <OptionList<string | null>
      legend="Setup"
      name="setup"
      chosen={view.setupId ?? 'any'}
      onChoose={(setupId) => onChange({ setupId })}
      choices={[
        { key: 'any', label: 'Any setup', value: null },
        ...overview.setups.map(({ key, label, n }) => ({ key, label, n, value: key })),
      ]}
    />
  );
}

export function OperatorChoices({ view, overview, onChange }: ChoicesProps) {
  return (
    <OptionList<string | null>
      legend="Operator"
      name="operator"
      chosen={view.operatorId ?? 'any'}
      onChoose={(operatorId) => onChange({ operatorId })}
      choices={[
        { key: 'any', label: 'Everyone', value: null },
        ...overview.operators.map(({ key, label, n }) => ({ key, label, n, value: key })),
      ]}
    />
  );
}
