import { ANTENNA_KINDS, antennaSchema } from '@harkmoor/sync-model/records/antenna';
import { plainAntenna } from '@harkmoor/sync-model/records/gear-defaults';
import { NumberField } from '../../design/form/NumberField';
import { SelectField } from '../../design/form/SelectField';
import { TextField } from '../../design/form/TextField';
import { ToggleField } from '../../design/form/ToggleField';
import { Caution } from '../../design/states/Caution';
import { AntennaRead } from './GearRead';
import { GearPiecePage, type PieceForm } from './GearPiecePage';
import { ANTENNA_KIND_WORDS } from './gear-words';

const KINDS = ANTENNA_KINDS.map((kind) => ({ value: kind, label: ANTENNA_KIND_WORDS[kind] }));

const ANTENNA = {
  type: 'antenna',
  schema: antennaSchema,
  fresh: plainAntenna('', 'wire'),
  Fields: AntennaFields,
  Read: AntennaRead,
} as const;

/** One antenna. */
export function AntennaPage() {
  return <GearPiecePage piece={ANTENNA} />;
}

function AntennaFields({ form, isNew }: { readonly form: PieceForm<'antenna'>; readonly isNew: boolean }) {
  const { values, set, errors } = form;
  const figure = (field: 'lengthM' | 'heightM' | 'azimuthDeg' | 'gainDb') => ({
    ...errors.field(field),
    value: values[field],
    onChange: (value: number | null) => set(field, value),
  });
  return (
    <>
      {isNew ? (
        <Caution title="Before you put it up">
          Keep wires and masts well away from power lines, off roads and paths, and out of trees that you
          would have to climb. Stop and disconnect at thunder. Never earth to the mains. Local codes and
          licensed practice come first.
        </Caution>
      ) : null}
      <TextField
        {...errors.field('name')}
        label="Name"
        required
        maxLength={60}
        value={values.name}
        onChange={(name) => set('name', name)}
      />
      <SelectField
        {...errors.field('kind')}
        label="Kind"
        required
        options={KINDS}
        value={values.kind}
        onChange={(kind) => set('kind', kind)}
      />
      <NumberField {...figure('lengthM')} label="Length" unit="m" />
      <NumberField {...figure('heightM')} label="Height above ground" unit="m" />
      <NumberField
        {...figure('azimuthDeg')}
        label="Direction, true"
        unit="°"
        hint="0 is true north, 90 east"
      />
      <NumberField {...figure('gainDb')} label="Gain" unit="dB" signed />
      <ToggleField
        label="Others may use it in their setups"
        value={values.sharedUse}
        onChange={(value) => set('sharedUse', value)}
      />
      <TextField
        {...errors.field('notes')}
        label="Notes"
        lines={3}
        maxLength={4000}
        value={values.notes ?? ''}
        onChange={(text) => set('notes', text === '' ? null : text)}
      />
    </>
  );
}
