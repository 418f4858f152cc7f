import { useId, useState } from 'react';
import { describedBy, FieldShell, type FieldProps } from './field-parts';
import { numberText, readNumber } from './read-number';

type NumberFieldProps = FieldProps & {
  readonly value: number | null;
  /** Null when empty, NaN when the text is no number: let the schema refuse it. */
  readonly onChange: (value: number | null) => void;
  /** Stands behind the figure: kHz, dB, m. */
  readonly unit?: string;
  /** True where values below zero make sense: phone keys for decimals have no minus sign. */
  readonly signed?: boolean;
};

/** A figure with its unit. Keeps what was typed while it is typed. */
export function NumberField(props: NumberFieldProps) {
  const id = useId();
  const [text, setText] = useState(() => numberText(props.value));
  const isSame = Object.is(readNumber(text), props.value);
  const shown = isSame || Number.isNaN(props.value) ? text : numberText(props.value);
  const isUnreadable = Number.isNaN(readNumber(shown));
  const error = props.error ?? (isUnreadable ? 'This is not a number' : null);
  const change = (next: string): void => {
    setText(next);
    props.onChange(readNumber(next));
  };
  return (
    <FieldShell {...props} error={error} id={id}>
      <div className="hm-with-unit">
        <input
          id={id}
          name={props.name}
          type="text"
          inputMode={props.signed ? 'text' : 'decimal'}
          autoComplete="off"
          className="hm-input num"
          value={shown}
          disabled={props.disabled}
          aria-required={props.required || undefined}
          aria-invalid={error ? true : undefined}
          aria-describedby={
            [props.unit ? `${id}-unit` : '', describedBy(id, { ...props, error })].join(' ').trim() ||
            undefined
          }
          onChange={(event) => change(event.target.value)}
        />
        {props.unit ? (
          <span className="hm-unit" id={`${id}-unit`}>
            {props.unit}
          </span>
        ) : null}
      </div>
    </FieldShell>
  );
}
