import type { FromDesk, ToDesk } from './desk-messages';
import { openEvidenceDesk, type EvidenceDesk } from './evidence-desk';

let desk: EvidenceDesk | null = null;

/** Reading and counting 100 000 receptions takes seconds on a phone: here they hold up no finger. */
self.addEventListener('message', ({ data }: MessageEvent<ToDesk>) => {
  if (data.type === 'open') {
    desk ??= openEvidenceDesk(data.address, () => send({ type: 'counted' }));
  } else if (data.type === 'watch') {
    desk?.watch(data.isWatched);
  } else {
    void answer(data);
  }
});

async function answer({ askId, question }: Extract<ToDesk, { type: 'ask' }>): Promise<void> {
  try {
    if (!desk) throw new Error('a question came before the club was named');
    send({ type: 'answer', askId, answer: await desk.ask(question) });
  } catch (error) {
    send({ type: 'failed', askId, message: error instanceof Error ? error.message : String(error) });
  }
}

function send(message: FromDesk): void {
  self.postMessage(message);
}
