import { useId } from 'react';
import './toggle.css';
import { describedBy, FieldNotes, type FieldProps } from './field-parts';

type ToggleFieldProps = Omit<FieldProps, 'required'> & {
  readonly value: boolean;
  readonly onChange: (value: boolean) => void;
};

/** On or off, at once. The whole line is the target. */
export function ToggleField(props: ToggleFieldProps) {
  const id = useId();
  return (
    <div className="hm-field hm-toggle-field">
      <label className="hm-toggle-line">
        <span>{props.label}</span>
        <input
          type="checkbox"
          role="switch"
          className="hm-toggle"
          name={props.name}
          checked={props.value}
          disabled={props.disabled}
          aria-describedby={describedBy(id, props)}
          onChange={(event) => props.onChange(event.target.checked)}
        />
      </label>
      <FieldNotes id={id} error={props.error} hint={props.hint} />
    </div>
  );
}
