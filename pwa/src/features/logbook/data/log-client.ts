import type { Ask, AnswerTo, FromDesk, LogAddress, LogDesk, ToDesk } from './desk-messages';
import { openLogDesk } from './log-desk';

export type LogClient = LogDesk & {
  /** Calls back when an answer may have become another; returns the way to stop. */
  onChange(listener: () => void): () => void;
};

type Waiting = { readonly resolve: (answer: never) => void; readonly reject: (error: Error) => void };

/** Opens the list of a log, in a worker where the browser has them. */
export function openLogClient(address: LogAddress): LogClient {
  const listeners = new Set<() => void>();
  const tell = (): void => listeners.forEach((listener) => listener());
  const desk = typeof Worker === 'undefined' ? openLogDesk(address, tell) : openWorkerDesk(address, tell);
  return {
    ...desk,
    onChange: (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}

function openWorkerDesk(address: LogAddress, onChange: () => void): LogDesk {
  const worker = new Worker(new URL('./log-worker.ts', import.meta.url), { type: 'module' });
  const waiting = new Map<number, Waiting>();
  let lastAsk = 0;
  const send = (message: ToDesk): void => worker.postMessage(message);
  const rejectAll = (message: string): void => {
    for (const { reject } of waiting.values()) reject(new Error(message));
    waiting.clear();
  };
  worker.addEventListener('message', ({ data }: MessageEvent<FromDesk>) => {
    if (data.type === 'changed') return onChange();
    const asked = waiting.get(data.askId);
    waiting.delete(data.askId);
    if (data.type === 'answer') asked?.resolve(data.answer as never);
    else asked?.reject(new Error(data.message));
  });
  worker.addEventListener('error', ({ message }) => rejectAll(message || 'The reading stopped.'));
  send({ type: 'open', address });
  return {
    ask: <A extends Ask>(ask: A) =>
      new Promise<AnswerTo<A>>((resolve, reject) => {
        lastAsk += 1;
        waiting.set(lastAsk, { resolve, reject });
        send({ type: 'ask', askId: lastAsk, ask });
      }),
    watch: (isWatched) => send({ type: 'watch', isWatched }),
    close: () => {
      worker.terminate();
      rejectAll('The log was closed.');
    },
  };
}
