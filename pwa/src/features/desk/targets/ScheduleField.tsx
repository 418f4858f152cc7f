import type { Schedule, ScheduleSlot } from '@harkmoor/sync-model/records/target';
import { Button } from '../../../design/button/Button';
import { ChoiceChips } from '../../../design/choice/ChoiceChips';
import { ManyChips } from '../../../design/choice/ManyChips';
import { TextField } from '../../../design/form/TextField';
import type { FormErrors } from '../../../design/form/use-form-errors';
import { readTimeOfDay } from '../target-import/read-schedule';

const DAYS = ['Mo', 'Tu', 'We', 'Th', 'Fr', 'Sa', 'Su'].map((label, at) => ({
  value: String(at + 1),
  label,
}));
const NEW_SLOT: ScheduleSlot = { from: '06:00', to: '22:00', days: [1, 2, 3, 4, 5, 6, 7] };
const SLOTS_MAX = 20;

type ScheduleFieldProps = {
  readonly errors: FormErrors;
  readonly schedule: Schedule;
  readonly onChange: (schedule: Schedule) => void;
};

/** When the target is on the air: always, or spans of UTC hours on days. */
export function ScheduleField({ errors, schedule, onChange }: ScheduleFieldProps) {
  const slots = schedule === 'always' ? [] : schedule;
  const set = (at: number, change: Partial<ScheduleSlot>) =>
    onChange(slots.map((slot, i) => (i === at ? { ...slot, ...change } : slot)));
  return (
    <>
      <ChoiceChips
        label="On air"
        options={[
          { value: 'always', label: 'Always' },
          { value: 'hours', label: 'At hours, UTC' },
        ]}
        value={schedule === 'always' ? 'always' : 'hours'}
        onChange={(value) => onChange(value === 'hours' ? [NEW_SLOT] : 'always')}
      />
      {slots.map((slot, at) => (
        <fieldset key={at} className="desk-slot">
          <legend className="only-heard">Span {at + 1}</legend>
          <TextField
            {...errors.field(`schedule.${at}.from`)}
            label="From"
            figures
            required
            value={slot.from}
            onChange={(from) => set(at, { from: tidyTime(from) })}
          />
          <TextField
            {...errors.field(`schedule.${at}.to`)}
            label="To"
            figures
            required
            value={slot.to}
            onChange={(to) => set(at, { to: tidyTime(to) })}
          />
          <ManyChips
            label="Days"
            options={DAYS}
            value={slot.days.map(String)}
            onChange={(days) => set(at, { days: days.map(Number).sort() })}
          />
          {slots.length > 1 ? (
            <Button look="quiet" onClick={() => onChange(slots.filter((_, i) => i !== at))}>
              Remove this span
            </Button>
          ) : null}
        </fieldset>
      ))}
      {slots.length > 0 && slots.length < SLOTS_MAX ? (
        <Button look="quiet" onClick={() => onChange([...slots, NEW_SLOT])}>
          Add a span
        </Button>
      ) : null}
    </>
  );
}

/** '0400' becomes '04:00' once it is whole; what is half typed stays as typed. */
function tidyTime(text: string): string {
  if (!/^\d{4}$/.test(text)) return text;
  const read = readTimeOfDay(text);
  return read.ok ? read.value : text;
}
