import { useId } from 'react';
import { describedBy, FieldShell, type FieldProps } from './field-parts';

export type Option<V extends string = string> = { readonly value: V; readonly label: string };

type SelectFieldProps<V extends string> = FieldProps & {
  readonly value: V | '';
  readonly onChange: (value: V) => void;
  readonly options: readonly Option<V>[];
  /** Shown while nothing is chosen. */
  readonly emptyLabel?: string;
};

/** One of a list that is too long for chips. */
export function SelectField<V extends string>(props: SelectFieldProps<V>) {
  const id = useId();
  return (
    <FieldShell {...props} id={id}>
      <select
        id={id}
        name={props.name}
        className="hm-input hm-select"
        value={props.value}
        disabled={props.disabled}
        aria-required={props.required || undefined}
        aria-invalid={props.error ? true : undefined}
        aria-describedby={describedBy(id, props)}
        onChange={(event) => props.onChange(event.target.value as V)}
      >
        {props.emptyLabel !== undefined ? <option value="">{props.emptyLabel}</option> : null}
        {props.options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
    </FieldShell>
  );
}
