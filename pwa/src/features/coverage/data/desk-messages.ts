import type { Answer, Question } from '../answers/questions';
import type { ClubAddress } from './evidence-desk';

/** What the screens' side sends to the worker. */
export type ToDesk =
  | { readonly type: 'open'; readonly address: ClubAddress }
  | { readonly type: 'ask'; readonly askId: number; readonly question: Question }
  | { readonly type: 'watch'; readonly isWatched: boolean };

/** What the worker sends back. */
export type FromDesk =
  | { readonly type: 'answer'; readonly askId: number; readonly answer: Answer }
  | { readonly type: 'failed'; readonly askId: number; readonly message: string }
  | { readonly type: 'counted' };
