import type { Answer } from '../answers/questions';
import type { FromDesk, ToDesk } from './desk-messages';
import { openEvidenceDesk, type ClubAddress, type EvidenceDesk } from './evidence-desk';

export type EvidenceClient = EvidenceDesk & {
  /** Calls back after each new count of the club; returns the way to stop. */
  onCounted(listener: () => void): () => void;
};

type Waiting = { readonly resolve: (answer: Answer) => void; readonly reject: (error: Error) => void };

/** Opens the evidence of a club, in a worker where the browser has them. */
export function openEvidenceClient(address: ClubAddress): EvidenceClient {
  const listeners = new Set<() => void>();
  const tell = (): void => listeners.forEach((listener) => listener());
  const desk =
    typeof Worker === 'undefined' ? openEvidenceDesk(address, tell) : openWorkerDesk(address, tell);
  return {
    ...desk,
    onCounted: (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}

function openWorkerDesk(address: ClubAddress, onCounted: () => void): EvidenceDesk {
  const worker = new Worker(new URL('./evidence-worker.ts', import.meta.url), { type: 'module' });
  const waiting = new Map<number, Waiting>();
  let lastAsk = 0;
  const send = (message: ToDesk): void => worker.postMessage(message);
  const rejectAll = (message: string): void => {
    for (const { reject } of waiting.values()) reject(new Error(message));
    waiting.clear();
  };
  worker.addEventListener('message', ({ data }: MessageEvent<FromDesk>) => {
    if (data.type === 'counted') return onCounted();
    const asked = waiting.get(data.askId);
    waiting.delete(data.askId);
    if (data.type === 'answer') asked?.resolve(data.answer);
    else asked?.reject(new Error(data.message));
  });
  worker.addEventListener('error', ({ message }) => rejectAll(message || 'The counting stopped.'));
  send({ type: 'open', address });
  return {
    ask: (question) =>
      new Promise((resolve, reject) => {
        lastAsk += 1;
        waiting.set(lastAsk, { resolve, reject });
        send({ type: 'ask', askId: lastAsk, question });
      }),
    watch: (isWatched) => send({ type: 'watch', isWatched }),
    close: () => {
      worker.terminate();
      rejectAll('The log was closed.');
    },
  };
}
