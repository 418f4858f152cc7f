import type { ReactNode } from 'react';
import './field.css';

/** What every field has beside its control. */
export type FieldProps = {
  readonly label: string;
  /** Also the name under which a form's errors point to it. */
  readonly name?: string;
  /** What is wrong and what to do; shown below the control and read with it. */
  readonly error?: string | null;
  /** What is meant, with an example where that is shorter. */
  readonly hint?: ReactNode;
  readonly required?: boolean;
  readonly disabled?: boolean;
};

/** The ids that tie label, hint and error to a control. */
export function describedBy(
  id: string,
  { error, hint }: Pick<FieldProps, 'error' | 'hint'>,
): string | undefined {
  const ids = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean).join(' ');
  return ids === '' ? undefined : ids;
}

/** Label above, hint and error below a control that carries `id`. */
export function FieldShell(props: FieldProps & { readonly id: string; readonly children: ReactNode }) {
  const { id, label, error, hint, required, children } = props;
  return (
    <div className={error ? 'hm-field hm-field-wrong' : 'hm-field'}>
      <label className="hm-label" htmlFor={id}>
        {label}
        {required ? null : <span className="hm-optional"> optional</span>}
      </label>
      {children}
      <FieldNotes id={id} error={error} hint={hint} />
    </div>
  );
}

/** Hint and error, each with the id that `describedBy` names. */
export function FieldNotes({
  id,
  error,
  hint,
}: Pick<FieldProps, 'error' | 'hint'> & { readonly id: string }) {
  return (
    <>
      {hint ? (
        <div className="hm-hint" id={`${id}-hint`}>
          {hint}
        </div>
      ) : null}
      {error ? (
        <div className="hm-error" id={`${id}-error`}>
          <span aria-hidden="true">! </span>
          {error}
        </div>
      ) : null}
    </>
  );
}
