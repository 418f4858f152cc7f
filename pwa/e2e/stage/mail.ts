import { MAIL } from './addresses';

type Mail = { readonly subject: string; readonly links: readonly string[] };

const LIMIT_MS = 30_000;

/** The link of the newest mail to an address whose subject matches, once it has come. */
export async function mailedLink(to: string, subject: RegExp): Promise<string> {
  for (const endMs = Date.now() + LIMIT_MS; Date.now() < endMs; await pause(250)) {
    const answer = await fetch(`${MAIL}/messages.json?to=${encodeURIComponent(to)}`);
    const mails = (await answer.json()) as Mail[];
    const link = mails.find((mail) => subject.test(mail.subject))?.links[0];
    if (link) return link;
  }
  throw new Error(`no mail to ${to} with a subject like ${String(subject)} came within ${LIMIT_MS} ms`);
}

function pause(ms: number): Promise<void> {
  return new Promise((resolve) => setTimeout(resolve, ms));
}
