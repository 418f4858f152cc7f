import { receiverSchema, type Receiver } from '@harkmoor/sync-model/records/receiver';
import { plainReceiver } from '@harkmoor/sync-model/records/gear-defaults';
import { useParams } from 'react-router-dom';
import { ChoiceChips } from '../../design/choice/ChoiceChips';
import { NumberField } from '../../design/form/NumberField';
import { TextField } from '../../design/form/TextField';
import { ToggleField } from '../../design/form/ToggleField';
import { PageFrame } from '../../design/page/PageFrame';
import { isNewId, paths } from '../../platform/paths';
import { isOwn, type Gear } from './data/gear';
import { useGearActs } from './data/use-gear-acts';
import { useGearWithUse } from './data/use-gear-with-use';
import { GearFormFrame } from './GearFormFrame';
import { ReceiverRead } from './GearRead';
import { METER_KIND_WORDS } from './gear-words';
import { NoSuchGear } from './NoSuchGear';
import { RangesField } from './RangesField';
import { useGearForm } from './use-gear-form';

const BACK = { to: paths.antennas(), label: 'Antennas' };
const METERS = (['s', 'dbm', 'none'] as const).map((kind) => ({
  value: kind,
  label: METER_KIND_WORDS[kind],
}));

/** What most portable sets cover; corrected in the form. */
const NEW_RECEIVER: Receiver = { ...plainReceiver(''), ranges: [{ lowHz: 150_000, highHz: 30_000_000 }] };

/** One receiver: made, corrected, replaced or put away by its owner; read by others. */
export function ReceiverPage() {
  const { id } = useParams();
  const found = useGearWithUse('receiver', id);
  if (!found)
    return (
      <PageFrame title="Receiver" back={BACK}>
        {null}
      </PageFrame>
    );
  const receiver = found.gear.receivers.find((row) => row.id === id);
  if (!isNewId(id) && !receiver) return <NoSuchGear what="receiver" />;
  return (
    <PageFrame title={receiver?.fields.name ?? 'New receiver'} back={BACK}>
      {receiver && !isOwn(found.gear.log, receiver) ? (
        <ReceiverRead receiver={receiver.fields} />
      ) : (
        <ReceiverForm
          key={id}
          gear={found.gear}
          id={receiver?.id ?? null}
          initial={receiver?.fields ?? NEW_RECEIVER}
          isUsed={found.isUsed}
        />
      )}
    </PageFrame>
  );
}

type ReceiverFormProps = {
  readonly gear: Gear;
  readonly id: string | null;
  readonly initial: Receiver;
  readonly isUsed: boolean;
};

function ReceiverForm({ gear, id, initial, isUsed }: ReceiverFormProps) {
  const form = useGearForm(initial, receiverSchema);
  const acts = useGearActs(gear.log, 'receiver', id);
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
      <TextField
        {...errors.field('name')}
        label="Name"
        required
        maxLength={60}
        value={values.name}
        onChange={(name) => set('name', name)}
      />
      <RangesField errors={errors} ranges={values.ranges} onChange={(ranges) => set('ranges', ranges)} />
      <MeterFields errors={errors} scale={values.meterScale} onChange={(scale) => set('meterScale', scale)} />
      <NumberField
        {...errors.field('dialStepHz')}
        label="Smallest step of the dial"
        unit="Hz"
        value={values.dialStepHz}
        onChange={(value) => set('dialStepHz', value)}
      />
      <NumberField
        {...errors.field('supplyMa')}
        label="Current drawn"
        unit="mA"
        value={values.supplyMa}
        onChange={(value) => set('supplyMa', value)}
      />
      <NumberField
        {...errors.field('batteryMah')}
        label="Battery"
        unit="mAh"
        value={values.batteryMah}
        onChange={(value) => set('batteryMah', value)}
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

type MeterFieldsProps = {
  readonly errors: ReturnType<typeof useGearForm>['errors'];
  readonly scale: Receiver['meterScale'];
  readonly onChange: (scale: Receiver['meterScale']) => void;
};

/** What the meter's figures mean. IARU Region 1 R.1: S9 is −73 dBm below 30 MHz, 6 dB an S-unit. */
function MeterFields({ errors, scale, onChange }: MeterFieldsProps) {
  const set = (change: Partial<Receiver['meterScale']>) => onChange({ ...scale, ...change });
  return (
    <>
      <ChoiceChips
        label="Meter"
        options={METERS}
        value={scale.kind}
        onChange={(kind) => kind !== null && set({ kind })}
      />
      {scale.kind === 's' ? (
        <>
          <NumberField
            {...errors.field('meterScale.s9Dbm')}
            label="S9 is"
            unit="dBm"
            signed
            required
            value={scale.s9Dbm}
            onChange={(value) => set({ s9Dbm: value ?? Number.NaN })}
            hint="−73 dBm by the common recommendation; many sets differ"
          />
          <NumberField
            {...errors.field('meterScale.dbPerS')}
            label="One S-unit is"
            unit="dB"
            required
            value={scale.dbPerS}
            onChange={(value) => set({ dbPerS: value ?? Number.NaN })}
          />
        </>
      ) : null}
      {scale.kind === 'none' ? null : (
        <ToggleField
          label="Checked against a known signal"
          hint="Levels of different receivers are only compared when their meters are checked"
          value={scale.calibrated}
          onChange={(calibrated) => set({ calibrated })}
        />
      )}
    </>
  );
}
