import { setupSchema, type Setup } from '@harkmoor/sync-model/records/setup';
import { plainSetup } from '@harkmoor/sync-model/records/gear-defaults';
import { useParams } from 'react-router-dom';
import { ButtonLink } from '../../design/button/ButtonLink';
import { NumberField } from '../../design/form/NumberField';
import { SelectField } from '../../design/form/SelectField';
import { TextField } from '../../design/form/TextField';
import { PageFrame } from '../../design/page/PageFrame';
import { EmptyState } from '../../design/states/EmptyState';
import { isNewId, paths } from '../../platform/paths';
import { isOwn, type Gear } from './data/gear';
import { useGearActs } from './data/use-gear-acts';
import { useGearWithUse } from './data/use-gear-with-use';
import { GearFormFrame } from './GearFormFrame';
import { SetupRead } from './GearRead';
import { setupName } from './gear-words';
import { NoSuchGear } from './NoSuchGear';
import { useGearForm } from './use-gear-form';

const BACK = { to: paths.antennas(), label: 'Antennas' };

/** One setup: a receiver with an antenna, and what stands between them. */
export function SetupPage() {
  const { id } = useParams();
  const found = useGearWithUse('setup', id);
  if (!found)
    return (
      <PageFrame title="Setup" back={BACK}>
        {null}
      </PageFrame>
    );
  const { gear } = found;
  const row = gear.setups.find(({ setup }) => setup.id === id);
  if (!isNewId(id) && !row) return <NoSuchGear what="setup" />;
  const [receiver, antenna] = [usable(gear, gear.receivers)[0], usable(gear, gear.antennas)[0]];
  return (
    <PageFrame title={row ? setupName(row) : 'New setup'} back={BACK}>
      {row && !isOwn(gear.log, row.setup) ? (
        <SetupRead row={row} />
      ) : row || (receiver && antenna) ? (
        <SetupForm
          key={id}
          gear={gear}
          id={row?.setup.id ?? null}
          initial={row?.setup.fields ?? plainSetup(receiver!.id, antenna!.id)}
        />
      ) : (
        <EmptyState
          title="A setup needs a receiver and an antenna"
          sentence="Add them first; then put them together here."
          action={
            <ButtonLink to={receiver ? paths.newAntenna() : paths.newReceiver()}>
              {receiver ? 'Add an antenna' : 'Add a receiver'}
            </ButtonLink>
          }
        />
      )}
    </PageFrame>
  );
}

function SetupForm({
  gear,
  id,
  initial,
}: {
  readonly gear: Gear;
  readonly id: string | null;
  readonly initial: Setup;
}) {
  const form = useGearForm(initial, setupSchema);
  const acts = useGearActs(gear.log, 'setup', id);
  return (
    <GearFormFrame
      errors={form.errors}
      isDirty={form.isDirty}
      isFaulty={form.isFaulty}
      asksHow={false}
      isRetired={initial.retiredAt !== null}
      onPutAway={acts.putAway}
      onTakeBack={acts.takeBack}
      onSave={() => acts.save('correct', form.values)}
    >
      <SetupFields gear={gear} form={form} />
    </GearFormFrame>
  );
}

type SetupFieldsProps = { readonly gear: Gear; readonly form: ReturnType<typeof useGearForm<Setup>> };

function SetupFields({ gear, form }: SetupFieldsProps) {
  const { values, set, errors } = form;
  const options = <
    T extends {
      id: string;
      ownerId: string | null;
      fields: { name: string; sharedUse: boolean; retiredAt: number | null };
    },
  >(
    rows: readonly T[],
    chosen: string,
  ) =>
    rows
      .filter((row) => row.id === chosen || isUsable(gear, row))
      .map((row) => ({ value: row.id, label: row.fields.name }));
  return (
    <>
      <SelectField
        {...errors.field('receiverId')}
        label="Receiver"
        required
        options={options(gear.receivers, values.receiverId)}
        value={values.receiverId}
        onChange={(value) => set('receiverId', value)}
      />
      <SelectField
        {...errors.field('antennaId')}
        label="Antenna"
        required
        options={options(gear.antennas, values.antennaId)}
        value={values.antennaId}
        onChange={(value) => set('antennaId', value)}
      />
      <TextField
        {...errors.field('coupling')}
        label="Coupling"
        hint="For example 9:1 transformer, clip lead"
        maxLength={60}
        value={values.coupling ?? ''}
        onChange={(text) => set('coupling', text === '' ? null : text)}
      />
      <NumberField
        {...errors.field('attenuationDb')}
        label="Attenuation"
        unit="dB"
        required
        value={values.attenuationDb}
        onChange={(value) => set('attenuationDb', value ?? 0)}
      />
      <NumberField
        {...errors.field('preampDb')}
        label="Preamplifier"
        unit="dB"
        required
        value={values.preampDb}
        onChange={(value) => set('preampDb', value ?? 0)}
      />
    </>
  );
}

type Usable = { ownerId: string | null; fields: { sharedUse: boolean; retiredAt: number | null } };

function isUsable(gear: Gear, row: Usable): boolean {
  return row.fields.retiredAt === null && (row.fields.sharedUse || isOwn(gear.log, row));
}

function usable<T extends Usable>(gear: Gear, rows: readonly T[]): T[] {
  return rows.filter((row) => isUsable(gear, row));
}
