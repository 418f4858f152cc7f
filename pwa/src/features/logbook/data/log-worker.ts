import type { FromDesk, LogDesk, ToDesk } from './desk-messages';
import { openLogDesk } from './log-desk';

let desk: LogDesk | null = null;

/** Reading and searching 100 000 receptions takes its time on a phone: here it holds up no finger. */
self.addEventListener('message', ({ data }: MessageEvent<ToDesk>) => {
  if (data.type === 'open') desk ??= openLogDesk(data.address, () => send({ type: 'changed' }));
  else if (data.type === 'watch') desk?.watch(data.isWatched);
  else void answer(data);
});

async function answer({ askId, ask }: Extract<ToDesk, { type: 'ask' }>): Promise<void> {
  try {
    if (!desk) throw new Error('a question came before the log was named');
    send({ type: 'answer', askId, answer: await desk.ask(ask) });
  } catch (error) {
    send({ type: 'failed', askId, message: error instanceof Error ? error.message : String(error) });
  }
}

function send(message: FromDesk): void {
  self.postMessage(message);
}
