import { LINK } from './links.mjs';

const KEPT = 200;

/**
 * The mails caught so far, newest first, in memory alone: the last 200.
 * A mail: { id, receivedAt, from, to: [address], subject, text, html, links: [url] }.
 */
export class Inbox {
  #mails = [];
  #lastId = 0;

  /** Keeps a mail as mailparser read it; `recipients` are the addresses of the envelope. */
  add(parsed, recipients, receivedAt) {
    const text = parsed.text ?? '';
    this.#lastId += 1;
    this.#mails.unshift({
      id: this.#lastId,
      receivedAt,
      from: parsed.from?.text ?? '',
      to: recipients,
      subject: parsed.subject ?? '',
      text,
      html: parsed.html || null,
      links: [...new Set(text.match(LINK) ?? [])],
    });
    this.#mails.length = Math.min(this.#mails.length, KEPT);
  }

  /** All mails, or those to one address. */
  list(address) {
    if (!address) return this.#mails;
    const wanted = address.toLowerCase();
    return this.#mails.filter(({ to }) => to.some((each) => each.toLowerCase() === wanted));
  }

  find(id) {
    return this.#mails.find((mail) => mail.id === id);
  }
}
