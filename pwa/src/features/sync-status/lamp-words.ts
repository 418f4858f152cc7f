import { timeOrDate } from '../../platform/utc-text';
import type { PauseReason } from '../../platform/sending';

/** What the lamp knows; the same words stand on the page of what waits. */
export type LampInput =
  | { kind: 'no-log' }
  | { kind: 'guest'; waiting: number }
  | {
      kind: 'account';
      waiting: number;
      refused: number;
      pause: PauseReason | null;
      isRunning: boolean;
      lastContactAt: number | null;
      completeAt: number | null;
    };

export type Lamp = { readonly look: 'sent' | 'waiting' | 'attention' | 'none'; readonly text: string };

/**
 * One true line. *Sent* only where nothing waits and a round was complete; never *verified*, which needs a
 * digest that is not exchanged yet.
 */
export function lampOf(input: LampInput, nowMs: number): Lamp {
  if (input.kind === 'no-log') return { look: 'none', text: 'No log yet' };
  if (input.kind === 'guest') {
    return {
      look: 'waiting',
      text: input.waiting === 0 ? 'On this phone only' : `${input.waiting} on this phone only`,
    };
  }
  if (input.refused > 0)
    return { look: 'attention', text: `${input.refused} need${input.refused === 1 ? 's' : ''} attention` };
  if (input.pause === 'signed-out') {
    return {
      look: 'waiting',
      text: input.waiting > 0 ? `Sign in to send ${input.waiting}` : 'Sign in to receive',
    };
  }
  const contact = input.lastContactAt ?? input.completeAt;
  const since = contact === null ? 'no contact yet' : `last contact ${timeOrDate(contact, nowMs)}`;
  if (input.waiting > 0) {
    return {
      look: 'waiting',
      text: input.isRunning ? `Sending ${input.waiting}` : `${input.waiting} only here · ${since}`,
    };
  }
  if (input.completeAt === null)
    return { look: 'waiting', text: input.isRunning ? 'Receiving' : `Nothing waits · ${since}` };
  return { look: 'sent', text: `Sent ${timeOrDate(input.completeAt, nowMs)} · works offline` };
}

/** Why nothing moves, in words, with what a person can do. */
export function pauseWords(pause: PauseReason): string {
  switch (pause) {
    case 'unreachable':
      return 'No signal, or the server does not answer. It is tried again by itself.';
    case 'signed-out':
      return 'The session has ended. Sign in to send; nothing is lost meanwhile.';
    case 'throttled':
      return 'The server asked to wait a little. It is tried again by itself.';
    case 'server-error':
      return 'The server has a fault. It is tried again by itself; your records are safe here.';
    case 'busy':
      return 'Another open window of this application is sending.';
    case 'protocol-too-old':
      return 'This version of the application is too old for the server. Open it with signal to update it.';
    case 'failed':
      return 'The last round stopped on a fault of this application. It is tried again by itself.';
  }
}
