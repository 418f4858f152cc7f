import type { Option } from '../form/SelectField';
import './chips.css';

type ManyChipsProps<V extends string> = {
  readonly label: string;
  readonly hideLabel?: boolean;
  readonly options: readonly Option<V>[];
  readonly value: readonly V[];
  readonly onChange: (value: V[]) => void;
  readonly oneLine?: boolean;
};

/** A row of chips of which any may be chosen: check boxes. */
export function ManyChips<V extends string>({
  label,
  hideLabel,
  options,
  value,
  onChange,
  oneLine,
}: ManyChipsProps<V>) {
  const toggle = (one: V): void =>
    onChange(value.includes(one) ? value.filter((other) => other !== one) : [...value, one]);
  return (
    <fieldset className="hm-chips">
      <legend className={hideLabel ? 'only-heard' : 'hm-label'}>{label}</legend>
      <div className={oneLine ? 'hm-chip-row hm-chip-line' : 'hm-chip-row'}>
        {options.map((option) => (
          <label key={option.value} className="hm-chip">
            <input
              type="checkbox"
              checked={value.includes(option.value)}
              onChange={() => toggle(option.value)}
            />
            <span>{option.label}</span>
          </label>
        ))}
      </div>
    </fieldset>
  );
}
