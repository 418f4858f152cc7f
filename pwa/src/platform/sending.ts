import { createContext, use } from 'react';

/** Why nothing is being sent, where something waits. */
export type PauseReason =
  'unreachable' | 'signed-out' | 'throttled' | 'server-error' | 'busy' | 'protocol-too-old' | 'failed';

/** What the screens are told of the sending: kept by the tab that syncs, told to the others. */
export type SendingStatus = {
  readonly isRunning: boolean;
  /** Keys `clubId/type/id` of the records that are on their way. */
  readonly inFlight: ReadonlySet<string>;
  readonly lastContactAt: number | null;
  readonly pause: PauseReason | null;
};

export type Sending = { readonly status: SendingStatus; sendNow(): void };

export const IDLE_SENDING: SendingStatus = {
  isRunning: false,
  inFlight: new Set(),
  lastContactAt: null,
  pause: null,
};

/** Provided by the sync's shell; a feature only reads it. */
export const SendingContext = createContext<Sending>({ status: IDLE_SENDING, sendNow: () => undefined });

export function useSending(): Sending {
  return use(SendingContext);
}
