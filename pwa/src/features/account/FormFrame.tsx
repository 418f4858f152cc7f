import type { FormEvent, ReactNode } from 'react';
import { Button } from '../../design/button/Button';
import { ErrorSummary } from '../../design/form/ErrorSummary';
import type { useRequest } from './use-request';
import './account.css';

type FormFrameProps = {
  readonly request: ReturnType<typeof useRequest>;
  readonly submitLabel: string;
  readonly onSubmit: () => Promise<void>;
  readonly children: ReactNode;
};

/** A form that asks the server: fields, what is wrong with them, the one button, and what the server said. */
export function FormFrame({ request, submitLabel, onSubmit, children }: FormFrameProps) {
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    void onSubmit();
  };
  return (
    <form ref={request.errors.ref} onSubmit={submit} noValidate>
      {children}
      <ErrorSummary form={request.errors} />
      <div role="alert">{request.trouble ? <p className="account-trouble">{request.trouble}</p> : null}</div>
      <Button type="submit" wide busy={request.isBusy}>
        {submitLabel}
      </Button>
    </form>
  );
}
