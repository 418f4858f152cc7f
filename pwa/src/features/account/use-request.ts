import { useState } from 'react';
import { useFormErrors, type FieldFault } from '../../design/form/use-form-errors';
import type { ApiAnswer } from '../../platform/api/api-request';
import { answerWords, faultsOfAnswer } from '../../platform/api/answer-words';

/** A form that asks the server once: busy while it asks, with the refusal in words beside the fields concerned. */
export function useRequest() {
  const errors = useFormErrors();
  const [isBusy, setBusy] = useState(false);
  const [trouble, setTrouble] = useState<string | null>(null);

  /** Asks unless the form itself has faults; the body where the server took it, else undefined. */
  async function ask<T>(
    faults: readonly FieldFault[],
    request: () => Promise<ApiAnswer<T>>,
  ): Promise<{ body: T } | undefined> {
    setTrouble(null);
    if (!errors.report(faults)) return undefined;
    setBusy(true);
    try {
      const answer = await request();
      if (answer.kind === 'ok') return { body: answer.body };
      const told = faultsOfAnswer(answer);
      if (told.length > 0) errors.report(told);
      else setTrouble(answerWords(answer));
      return undefined;
    } finally {
      setBusy(false);
    }
  }
  return { errors, isBusy, trouble, ask };
}
