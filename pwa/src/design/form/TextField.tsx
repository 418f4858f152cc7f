import { useId, type HTMLInputTypeAttribute, type Ref } from 'react';
import { describedBy, FieldShell, type FieldProps } from './field-parts';

type TextFieldProps = FieldProps & {
  readonly value: string;
  readonly onChange: (value: string) => void;
  readonly type?: Extract<HTMLInputTypeAttribute, 'text' | 'email' | 'password' | 'search' | 'url'>;
  readonly autoComplete?: string;
  readonly inputMode?: 'text' | 'email' | 'numeric' | 'decimal' | 'search' | 'url';
  readonly autoCapitalize?: 'none' | 'characters' | 'sentences' | 'words';
  readonly placeholder?: string;
  readonly maxLength?: number;
  /** More than 1 makes a text area of that many lines. */
  readonly lines?: number;
  /** Figures of one width: locators, times, dates. */
  readonly figures?: boolean;
  readonly inputRef?: Ref<HTMLInputElement>;
};

/** One line, or several, of text. */
export function TextField(props: TextFieldProps) {
  const id = useId();
  const shared = {
    id,
    name: props.name,
    value: props.value,
    disabled: props.disabled,
    maxLength: props.maxLength,
    placeholder: props.placeholder,
    autoComplete: props.autoComplete ?? 'off',
    autoCapitalize: props.autoCapitalize,
    className: props.figures ? 'hm-input num' : 'hm-input',
    'aria-required': props.required || undefined,
    'aria-invalid': props.error ? true : undefined,
    'aria-describedby': describedBy(id, props),
  };
  return (
    <FieldShell {...props} id={id}>
      {props.lines !== undefined && props.lines > 1 ? (
        <textarea {...shared} rows={props.lines} onChange={(event) => props.onChange(event.target.value)} />
      ) : (
        <input
          {...shared}
          ref={props.inputRef}
          type={props.type ?? 'text'}
          inputMode={props.inputMode}
          onChange={(event) => props.onChange(event.target.value)}
        />
      )}
    </FieldShell>
  );
}
