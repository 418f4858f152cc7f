import http from 'node:http';
import { listPage, mailPage, missingPage } from './pages.mjs';

const HEADERS = {
  'Content-Security-Policy':
    "default-src 'none'; style-src 'unsafe-inline'; base-uri 'none'; form-action 'none'; frame-ancestors 'none'",
  'X-Content-Type-Options': 'nosniff',
  'Cache-Control': 'no-store',
};
const OWN_HOST = /^(127\.0\.0\.1|localhost)(:\d+)?$/;

/**
 * The inbox in the browser: `/` lists, `/messages/N` shows one, `/messages.json` (optionally `?to=address`) is for tests.
 * A page of another site that points its name at this machine gets nothing: the mails hold sign-in links.
 */
export function makeWebServer(inbox) {
  return http.createServer((request, response) => {
    if (!OWN_HOST.test(request.headers.host ?? ''))
      return answer(response, 403, 'text/plain', 'Only this machine may look.');
    const url = new URL(request.url ?? '/', 'http://127.0.0.1');
    if (url.pathname === '/') return answer(response, 200, 'text/html', listPage(inbox.list()));
    if (url.pathname === '/messages.json') {
      return answer(
        response,
        200,
        'application/json',
        JSON.stringify(inbox.list(url.searchParams.get('to'))),
      );
    }
    const mail = inbox.find(Number(/^\/messages\/(\d+)$/.exec(url.pathname)?.[1]));
    return mail
      ? answer(response, 200, 'text/html', mailPage(mail))
      : answer(response, 404, 'text/html', missingPage());
  });
}

function answer(response, status, type, body) {
  response.writeHead(status, { ...HEADERS, 'Content-Type': `${type}; charset=utf-8` }).end(body);
}
