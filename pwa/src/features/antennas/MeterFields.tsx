import type { Receiver } from '@harkmoor/sync-model/records/receiver';
import { ChoiceChips } from '../../design/choice/ChoiceChips';
import { NumberField } from '../../design/form/NumberField';
import { ToggleField } from '../../design/form/ToggleField';
import type { FormErrors } from '../../design/form/use-form-errors';
import { METER_KIND_WORDS } from './gear-words';

const METERS = (['s', 'dbm', 'none'] as const).map((kind) => ({
  value: kind,
  label: METER_KIND_WORDS[kind],
}));

type MeterFieldsProps = {
  readonly errors: FormErrors;
  readonly scale: Receiver['meterScale'];
  readonly onChange: (scale: Receiver['meterScale']) => void;
};

/** What the meter's figures mean. IARU Region 1 R.1: S9 is −73 dBm below 30 MHz, 6 dB an S-unit. */
export function MeterFields({ errors, scale, onChange }: MeterFieldsProps) {
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
