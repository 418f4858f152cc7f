import { ChoiceChips } from '../../../design/choice/ChoiceChips';
import { ManyChips } from '../../../design/choice/ManyChips';
import { isAllHours, RANGE_LENGTHS_H, rangeWords } from '../view/hour-range';
import { monthWords } from '../view/months';
import type { ChoicesProps } from './FilterSheets';
import { HoursTrack } from './HoursTrack';

/** How many hours, and from which on. */
export function HoursChoices({ view, onChange }: ChoicesProps) {
  const { hours } = view;
  const setLength = (length: string | null): void => {
    if (length !== null) onChange({ hours: { ...hours, lengthH: Number(length) } });
  };
  return (
    <>
      <p className="num">
        <strong>{rangeWords(hours)}</strong>
        {isAllHours(hours) ? '' : '. Slide the handle, or step it with the arrow keys.'}
      </p>
      <HoursTrack range={hours} sun={[]} onChange={(next) => onChange({ hours: next })} />
      <ChoiceChips
        label="How many hours"
        options={RANGE_LENGTHS_H.map((length) => ({
          value: String(length),
          label: length === 24 ? 'All 24' : String(length),
        }))}
        value={String(hours.lengthH)}
        onChange={setLength}
      />
    </>
  );
}

/** Months with an observation; none chosen means all. */
export function MonthChoices({ view, overview, onChange }: ChoicesProps) {
  return (
    <ManyChips
      label="Months, UTC (none chosen: all)"
      options={overview.monthKeys.map((key) => ({ value: key, label: monthWords(key) }))}
      value={view.monthKeys}
      onChange={(monthKeys) => onChange({ monthKeys: [...monthKeys].sort() })}
    />
  );
}
