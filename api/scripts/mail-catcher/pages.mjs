import { LINK } from './links.mjs';

const STYLE = `body{font:16px/1.5 sans-serif;margin:2rem auto;max-width:52rem;padding:0 1rem;background:#FAF7F0;color:#231B14}
a{color:#22586B}table{border-collapse:collapse;width:100%}th,td{text-align:left;padding:.5rem;border-bottom:1px solid #E2DACC}
pre{white-space:pre-wrap;overflow-wrap:anywhere;font:inherit}`;

const ENTITIES = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };

/** Text as HTML that shows it and does nothing else. */
export function escapeHtml(text) {
  return text.replace(/[&<>"']/g, (character) => ENTITIES[character]);
}

/** The list of mails, which looks again every five seconds. */
export function listPage(mails) {
  const rows = mails.map(
    ({ id, receivedAt, to, subject }) =>
      `<tr><td>${escapeHtml(receivedAt.slice(0, 19).replace('T', ' '))} UTC</td><td>${escapeHtml(to.join(', '))}</td>` +
      `<td><a href="/messages/${id}">${escapeHtml(subject || '(no subject)')}</a></td></tr>`,
  );
  const table = `<table><thead><tr><th>Received</th><th>To</th><th>Subject</th></tr></thead><tbody>${rows.join('')}</tbody></table>`;
  const empty = '<p>No mail yet. Whatever Harkmoor sends from this machine lands here, and nowhere else.</p>';
  return page(
    'Mail',
    `<h1>Mail</h1>${mails.length > 0 ? table : empty}`,
    '<meta http-equiv="refresh" content="5">',
  );
}

/** One mail as text, its links to be followed. */
export function mailPage({ subject, from, to, receivedAt, text }) {
  const head = `<p>From ${escapeHtml(from)}<br>To ${escapeHtml(to.join(', '))}<br>${escapeHtml(receivedAt)}</p>`;
  return page(
    subject,
    `<p><a href="/">All mail</a></p><h1>${escapeHtml(subject || '(no subject)')}</h1>${head}<pre>${withLinks(text)}</pre>`,
  );
}

export function missingPage() {
  return page('Not here', '<h1>Not here</h1><p>There is no such mail. <a href="/">All mail</a></p>');
}

function withLinks(text) {
  const urls = text.match(LINK) ?? [];
  const between = text.split(LINK).map(escapeHtml);
  return between.map((part, index) => part + (index < urls.length ? link(urls[index]) : '')).join('');
}

function link(url) {
  const safe = escapeHtml(url);
  return `<a href="${safe}" rel="noreferrer">${safe}</a>`;
}

function page(title, body, head = '') {
  return `<!doctype html><html lang="en-GB"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width">${head}<title>${escapeHtml(title)} · Harkmoor mail catcher</title><style>${STYLE}</style></head><body>${body}</body></html>`;
}
