import { useCallback, useState } from 'react';
import { apiRequest, type ApiAnswer } from '../../../platform/api/api-request';
import type { Change } from '../record/changes';

export type AllChanges =
  | { readonly kind: 'not-asked' }
  | { readonly kind: 'asking' }
  | { readonly kind: 'read'; readonly changes: readonly Change[] }
  | { readonly kind: 'failed'; readonly sentence: string };

type HistoryAnswer = { readonly rows: readonly Change[] };

/** Every replaced value that the server keeps of a reception, asked for by hand: most of them travel nowhere. */
export function useAllChanges(at: {
  readonly clubId: string;
  readonly id: string;
  readonly accountId: string | null;
}): [AllChanges, () => void] {
  const { clubId, id, accountId } = at;
  const [state, setState] = useState<AllChanges>({ kind: 'not-asked' });
  const read = useCallback(() => {
    if (accountId === null) return;
    setState({ kind: 'asking' });
    const path = `/api/clubs/${clubId}/records/reception/${id}/history`;
    void apiRequest<HistoryAnswer>(path, { accountId }).then((answer) => setState(stateOf(answer)));
  }, [clubId, id, accountId]);
  return [state, read];
}

function stateOf(answer: ApiAnswer<HistoryAnswer>): AllChanges {
  switch (answer.kind) {
    case 'ok':
      return { kind: 'read', changes: answer.body.rows };
    case 'unreachable':
      return {
        kind: 'failed',
        sentence: 'The server is out of reach. What stands here is what this device holds.',
      };
    case 'throttled':
      return { kind: 'failed', sentence: 'The server asks to wait a little. Try again in a minute.' };
    case 'signed-out':
      return {
        kind: 'failed',
        sentence: 'Sign in again to read what the server keeps. Nothing here is lost.',
      };
    case 'refused':
      return { kind: 'failed', sentence: answer.message };
  }
}
