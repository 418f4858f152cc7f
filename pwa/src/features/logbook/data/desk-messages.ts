import type { ItuRegion } from '@harkmoor/sync-model/radio/bands/region';
import type { LogChoices } from '../index/log-choices';
import type { LogFilter } from '../index/log-filter';
import type { GroupHead, ShownRow } from '../index/log-view';

/** Which log is read, and as whose. */
export type LogAddress = {
  readonly databaseName: string;
  readonly clubId: string;
  readonly region: ItuRegion;
  readonly ownId: string | null;
};

export type LogView = {
  /** Grows with each answer; rows are asked for by it. */
  readonly viewId: number;
  readonly heads: readonly GroupHead[];
  readonly shownCount: number;
  /** How many would be shown with nothing that narrows. */
  readonly ofCount: number;
  /** What of the log has been read so far, and what it holds; equal once all is read. */
  readonly readCount: number;
  readonly heldCount: number;
  readonly isComplete: boolean;
};

/** Null where a newer view has replaced the one that was asked about. */
export type RowWindow = { readonly from: number; readonly rows: readonly ShownRow[] } | null;

export type Ask =
  | { readonly type: 'view'; readonly filter: LogFilter; readonly nowMs: number }
  | { readonly type: 'rows'; readonly viewId: number; readonly from: number; readonly to: number }
  | { readonly type: 'choices' };

export type AnswerTo<A extends Ask> = {
  view: LogView;
  rows: RowWindow;
  choices: LogChoices;
}[A['type']];

export type ToDesk =
  | { readonly type: 'open'; readonly address: LogAddress }
  | { readonly type: 'watch'; readonly isWatched: boolean }
  | { readonly type: 'ask'; readonly askId: number; readonly ask: Ask };

export type FromDesk =
  | { readonly type: 'changed' }
  | { readonly type: 'answer'; readonly askId: number; readonly answer: unknown }
  | { readonly type: 'failed'; readonly askId: number; readonly message: string };

/** Answers about one log, kept current while records change. */
export type LogDesk = {
  ask<A extends Ask>(ask: A): Promise<AnswerTo<A>>;
  /** While nobody looks, a write is only noted. */
  watch(isWatched: boolean): void;
  close(): void;
};
