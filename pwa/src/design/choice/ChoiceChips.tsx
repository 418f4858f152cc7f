import { useId } from 'react';
import type { Option } from '../form/SelectField';
import './chips.css';

type ChoiceChipsProps<V extends string> = {
  readonly label: string;
  /** Keeps the label for screen readers only, where the row explains itself. */
  readonly hideLabel?: boolean;
  readonly options: readonly Option<V>[];
  readonly value: V | null;
  readonly onChange: (value: V | null) => void;
  /** True where a second tap on the chosen chip takes the choice back (*not read*). */
  readonly clearable?: boolean;
  /** True for one line that scrolls sideways; otherwise the chips wrap. */
  readonly oneLine?: boolean;
  readonly error?: string | null;
  readonly name?: string;
};

/** A row of chips of which one is chosen: radio buttons, with the arrow keys of radio buttons. */
export function ChoiceChips<V extends string>(props: ChoiceChipsProps<V>) {
  const group = useId();
  const tapAgain = (value: V): void => {
    if (props.clearable && props.value === value) props.onChange(null);
  };
  return (
    <fieldset className="hm-chips" aria-describedby={props.error ? `${group}-error` : undefined}>
      <legend className={props.hideLabel ? 'only-heard' : 'hm-label'}>{props.label}</legend>
      <div className={props.oneLine ? 'hm-chip-row hm-chip-line' : 'hm-chip-row'}>
        {props.options.map((option) => (
          <label key={option.value} className="hm-chip">
            <input
              type="radio"
              name={props.name ?? group}
              checked={props.value === option.value}
              onChange={() => props.onChange(option.value)}
              onClick={() => tapAgain(option.value)}
            />
            <span>{option.label}</span>
          </label>
        ))}
      </div>
      {props.error ? (
        <div className="hm-error" id={`${group}-error`}>
          {props.error}
        </div>
      ) : null}
    </fieldset>
  );
}
