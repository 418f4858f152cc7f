import { receiverSchema, type Receiver } from '@harkmoor/sync-model/records/receiver';
import { plainReceiver } from '@harkmoor/sync-model/records/gear-defaults';
import { NumberField } from '../../design/form/NumberField';
import { TextField } from '../../design/form/TextField';
import { ToggleField } from '../../design/form/ToggleField';
import { ReceiverRead } from './GearRead';
import { GearPiecePage, type PieceForm } from './GearPiecePage';
import { MeterFields } from './MeterFields';
import { RangesField } from './RangesField';

/** What most portable sets cover; corrected in the form. */
const FRESH: Receiver = { ...plainReceiver(''), ranges: [{ lowHz: 150_000, highHz: 30_000_000 }] };

const RECEIVER = {
  type: 'receiver',
  schema: receiverSchema,
  fresh: FRESH,
  Fields: ReceiverFields,
  Read: ReceiverRead,
} as const;

/** One receiver. */
export function ReceiverPage() {
  return <GearPiecePage piece={RECEIVER} />;
}

function ReceiverFields({ form }: { readonly form: PieceForm<'receiver'> }) {
  const { values, set, errors } = form;
  const figure = (field: 'dialStepHz' | 'supplyMa' | 'batteryMah') => ({
    ...errors.field(field),
    value: values[field],
    onChange: (value: number | null) => set(field, value),
  });
  return (
    <>
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
      <NumberField {...figure('dialStepHz')} label="Smallest step of the dial" unit="Hz" />
      <NumberField {...figure('supplyMa')} label="Current drawn" unit="mA" />
      <NumberField {...figure('batteryMah')} label="Battery" unit="mAh" />
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
