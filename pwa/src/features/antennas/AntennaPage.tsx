import { ANTENNA_KINDS, antennaSchema, type Antenna } from '@harkmoor/sync-model/records/antenna';
import { plainAntenna } from '@harkmoor/sync-model/records/gear-defaults';
import { useParams } from 'react-router-dom';
import { NumberField } from '../../design/form/NumberField';
import { SelectField } from '../../design/form/SelectField';
import { TextField } from '../../design/form/TextField';
import { ToggleField } from '../../design/form/ToggleField';
import { PageFrame } from '../../design/page/PageFrame';
import { Caution } from '../../design/states/Caution';
import { isNewId, paths } from '../../platform/paths';
import { isOwn, type Gear } from './data/gear';
import { AntennaRead } from './GearRead';
import { GearFormFrame } from './GearFormFrame';
import { ANTENNA_KIND_WORDS } from './gear-words';
import { NoSuchGear } from './NoSuchGear';
import { useGearWithUse } from './data/use-gear-with-use';
import { useGearForm } from './use-gear-form';
import { useGearActs } from './data/use-gear-acts';

const BACK = { to: paths.antennas(), label: 'Antennas' };
const KINDS = ANTENNA_KINDS.map((kind) => ({ value: kind, label: ANTENNA_KIND_WORDS[kind] }));

const NEW_ANTENNA = plainAntenna('', 'wire');

/** One antenna: made, corrected, replaced or put away by its owner; read by others. */
export function AntennaPage() {
  const { id } = useParams();
  const found = useGearWithUse('antenna', id);
  if (!found)
    return (
      <PageFrame title="Antenna" back={BACK}>
        {null}
      </PageFrame>
    );
  const antenna = found.gear.antennas.find((row) => row.id === id);
  if (!isNewId(id) && !antenna) return <NoSuchGear what="antenna" />;
  return (
    <PageFrame title={antenna?.fields.name ?? 'New antenna'} back={BACK}>
      {antenna && !isOwn(found.gear.log, antenna) ? (
        <AntennaRead antenna={antenna.fields} />
      ) : (
        <AntennaForm
          key={id}
          gear={found.gear}
          id={antenna?.id ?? null}
          initial={antenna?.fields ?? NEW_ANTENNA}
          isUsed={found.isUsed}
        />
      )}
    </PageFrame>
  );
}

type AntennaFormProps = {
  readonly gear: Gear;
  readonly id: string | null;
  readonly initial: Antenna;
  readonly isUsed: boolean;
};

function AntennaForm({ gear, id, initial, isUsed }: AntennaFormProps) {
  const form = useGearForm(initial, antennaSchema);
  const acts = useGearActs(gear.log, 'antenna', id);
  const { values, set, errors } = form;
  return (
    <GearFormFrame
      errors={errors}
      isDirty={form.isDirty}
      isFaulty={form.isFaulty}
      asksHow={isUsed}
      isRetired={initial.retiredAt !== null}
      onPutAway={acts.putAway}
      onTakeBack={acts.takeBack}
      onSave={(how) => acts.save(how, values)}
    >
      {id === null ? (
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
      <NumberField
        {...errors.field('lengthM')}
        label="Length"
        unit="m"
        value={values.lengthM}
        onChange={(value) => set('lengthM', value)}
      />
      <NumberField
        {...errors.field('heightM')}
        label="Height above ground"
        unit="m"
        value={values.heightM}
        onChange={(value) => set('heightM', value)}
      />
      <NumberField
        {...errors.field('azimuthDeg')}
        label="Direction, true"
        unit="°"
        hint="0 is true north, 90 east"
        value={values.azimuthDeg}
        onChange={(value) => set('azimuthDeg', value)}
      />
      <NumberField
        {...errors.field('gainDb')}
        label="Gain"
        unit="dB"
        signed
        value={values.gainDb}
        onChange={(value) => set('gainDb', value)}
      />
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
    </GearFormFrame>
  );
}
