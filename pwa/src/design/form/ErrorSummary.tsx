import type { FormErrors } from './use-form-errors';

/** Above the form's button: how many fields need a look, each a link to its field. Nothing when there is no fault. */
export function ErrorSummary({ form }: { readonly form: FormErrors }) {
  const { faults } = form;
  const go = (name: string): void =>
    form.ref.current?.querySelector<HTMLElement>(`[name="${CSS.escape(name)}"]`)?.focus();
  return (
    <div role="alert">
      {faults.length === 0 ? null : (
        <div className="hm-summary" tabIndex={-1}>
          <strong>
            {faults.length === 1 ? 'One field needs a look' : `${faults.length} fields need a look`}
          </strong>
          <ul>
            {faults.map((fault) => (
              <li key={fault.field}>
                <button type="button" onClick={() => go(fault.field)}>
                  {fault.message}
                </button>
              </li>
            ))}
          </ul>
        </div>
      )}
    </div>
  );
}
