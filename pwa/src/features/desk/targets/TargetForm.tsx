import { frequencyText, readFrequency } from '@harkmoor/sync-model/radio/bands/frequency-text';
import { MODES } from '@harkmoor/sync-model/records/common-fields';
import { targetSchema, type Target } from '@harkmoor/sync-model/records/target';
import { useState, type FormEvent } from 'react';
import { Button } from '../../../design/button/Button';
import { ErrorSummary } from '../../../design/form/ErrorSummary';
import { NumberField } from '../../../design/form/NumberField';
import { SelectField } from '../../../design/form/SelectField';
import { TextField } from '../../../design/form/TextField';
import { useFormErrors, type FieldFault, type FormErrors } from '../../../design/form/use-form-errors';
import { schemaFaults } from '../../../platform/schema-faults';
import { ScheduleField } from './ScheduleField';

const MODE_OPTIONS = MODES.map((mode) => ({ value: mode, label: mode }));

type TargetFormProps = {
  readonly listId: string;
  readonly target: Target | null;
  readonly onSave: (target: Target) => Promise<void>;
  readonly onRemove?: () => Promise<void>;
};

/** One target of a list. */
export function TargetForm({ listId, target, onSave, onRemove }: TargetFormProps) {
  const errors = useFormErrors();
  const [values, setValues] = useState<Target>(target ?? newTarget(listId));
  const [frequency, setFrequency] = useState(target ? frequencyText(target.frequencyHz) : '');
  const set = (change: Partial<Target>): void => {
    for (const field of Object.keys(change)) errors.mended(field);
    setValues((before) => ({ ...before, ...change }));
  };
  async function submit(event: FormEvent): Promise<void> {
    event.preventDefault();
    const { frequencyHz, faults } = readHz(frequency);
    const whole: Target = { ...values, name: values.name.trim().normalize('NFC'), frequencyHz };
    if (errors.report([...faults, ...schemaFaults(targetSchema, whole)])) await onSave(whole);
  }
  return (
    <form ref={errors.ref} noValidate onSubmit={(event) => void submit(event)}>
      <TargetFields
        errors={errors}
        values={values}
        set={set}
        frequency={frequency}
        onFrequency={setFrequency}
      />
      <ErrorSummary form={errors} />
      <Button type="submit" wide>
        Save the target
      </Button>
      {onRemove ? (
        <Button look="danger" onClick={() => void onRemove()}>
          Remove from the list
        </Button>
      ) : null}
    </form>
  );
}

type TargetFieldsProps = {
  readonly errors: FormErrors;
  readonly values: Target;
  readonly set: (change: Partial<Target>) => void;
  readonly frequency: string;
  readonly onFrequency: (text: string) => void;
};

function TargetFields({ errors, values, set, frequency, onFrequency }: TargetFieldsProps) {
  const orNull = (text: string) => (text === '' ? null : text);
  return (
    <>
      <TextField
        {...errors.field('name')}
        label="Name"
        required
        maxLength={80}
        value={values.name}
        onChange={(name) => set({ name })}
      />
      <TextField
        {...errors.field('frequencyHz')}
        label="Frequency"
        hint="Plain figures are kHz; write MHz for others"
        required
        figures
        inputMode="text"
        value={frequency}
        onChange={onFrequency}
      />
      <SelectField
        {...errors.field('mode')}
        label="Mode"
        required
        options={MODE_OPTIONS}
        value={values.mode}
        onChange={(mode) => set({ mode })}
      />
      <ScheduleField errors={errors} schedule={values.schedule} onChange={(schedule) => set({ schedule })} />
      <TransmitterFields errors={errors} tx={values.tx} onTx={(point) => set({ tx: point })} />
      <NumberField
        {...errors.field('powerKw')}
        label="Power"
        unit="kW"
        value={values.powerKw}
        onChange={(powerKw) => set({ powerKw })}
      />
      <TextField
        {...errors.field('language')}
        label="Language"
        maxLength={40}
        value={values.language ?? ''}
        onChange={(text) => set({ language: orNull(text) })}
      />
      <TextField
        {...errors.field('note')}
        label="Note"
        lines={2}
        maxLength={4000}
        value={values.note ?? ''}
        onChange={(text) => set({ note: orNull(text) })}
      />
    </>
  );
}

type TransmitterFieldsProps = {
  readonly errors: FormErrors;
  readonly tx: Target['tx'];
  readonly onTx: (tx: Target['tx']) => void;
};

/** Both figures or none; one alone becomes no number, which the schema refuses by name. */
function TransmitterFields({ errors, tx, onTx }: TransmitterFieldsProps) {
  const setPoint = (change: { latDeg?: number | null; lonDeg?: number | null }): void => {
    const point = { latDeg: tx?.latDeg ?? null, lonDeg: tx?.lonDeg ?? null, ...change };
    const isEmpty = isNothing(point.latDeg) && isNothing(point.lonDeg);
    onTx(isEmpty ? null : { latDeg: point.latDeg ?? Number.NaN, lonDeg: point.lonDeg ?? Number.NaN });
  };
  return (
    <>
      <NumberField
        {...errors.field('tx.latDeg')}
        label="Transmitter latitude"
        unit="°"
        signed
        value={tx?.latDeg ?? null}
        onChange={(latDeg) => setPoint({ latDeg })}
      />
      <NumberField
        {...errors.field('tx.lonDeg')}
        label="Transmitter longitude"
        unit="°"
        signed
        hint="East is positive"
        value={tx?.lonDeg ?? null}
        onChange={(lonDeg) => setPoint({ lonDeg })}
      />
    </>
  );
}

function isNothing(figure: number | null): boolean {
  return figure === null || Number.isNaN(figure);
}

function newTarget(listId: string): Target {
  return {
    deleted: false,
    importId: null,
    listId,
    name: '',
    frequencyHz: 0,
    mode: 'AM',
    schedule: 'always',
    silences: [],
    tx: null,
    powerKw: null,
    language: null,
    note: null,
  };
}

/** An unreadable frequency becomes one that the schema takes, so that only its own sentence is shown. */
function readHz(text: string): { frequencyHz: number; faults: FieldFault[] } {
  const reading = readFrequency(text);
  if (reading.kind === 'frequency') return { frequencyHz: reading.frequencyHz, faults: [] };
  const message =
    reading.kind === 'refused' ? reading.message : 'A metre band is no frequency: write the figure in kHz';
  return { frequencyHz: 1000, faults: [{ field: 'frequencyHz', message }] };
}
