import type { ApiAnswer } from './api-request';

type NotOk = Exclude<ApiAnswer<never>, { kind: 'ok' }>;

/** What to tell a person whose request brought nothing, and what they can do. */
export function answerWords(answer: NotOk): string {
  switch (answer.kind) {
    case 'refused':
      return answer.message;
    case 'signed-out':
      return 'The session has ended. Sign in again; nothing on this phone is lost.';
    case 'throttled':
      return `Too many tries. Wait ${Math.ceil(answer.retryAfterMs / 1000)} seconds, then try again.`;
    case 'unreachable':
      return 'No answer from the server. This needs signal; logging does not.';
  }
}

/** The server's remarks on single fields, for the form. */
export function faultsOfAnswer(answer: NotOk): { field: string; message: string }[] {
  if (answer.kind !== 'refused') return [];
  return Object.entries(answer.fields).map(([field, message]) => ({ field, message }));
}
