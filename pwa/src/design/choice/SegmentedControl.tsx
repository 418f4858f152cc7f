import { useId, type ReactNode } from 'react';
import type { Option } from '../form/SelectField';
import './segments.css';

type SegmentedControlProps<V extends string> = {
  /** Said by screen readers; the row has no visible label. */
  readonly label: string;
  readonly options: readonly Option<V>[];
  readonly value: V | null;
  readonly onChange: (value: V) => void;
  /** A last cell for another act, e.g. a `+`. */
  readonly extra?: ReactNode;
};

/** A few choices in one bordered row, of which one holds: the setup switch, the map's measure. */
export function SegmentedControl<V extends string>({
  label,
  options,
  value,
  onChange,
  extra,
}: SegmentedControlProps<V>) {
  const group = useId();
  return (
    <fieldset className="hm-segments">
      <legend className="only-heard">{label}</legend>
      {options.map((option) => (
        <label key={option.value}>
          <input
            type="radio"
            name={group}
            checked={value === option.value}
            onChange={() => onChange(option.value)}
          />
          <span>{option.label}</span>
        </label>
      ))}
      {extra}
    </fieldset>
  );
}
