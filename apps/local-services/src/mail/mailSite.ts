import { type IncomingMessage, type RequestListener, type ServerResponse } from 'node:http';
import { type Mailbox } from './mailbox';
import { listPage, messagePage } from './mailPages';

/** No script runs on these pages, whatever a mail holds. */
const headers = {
  'Content-Security-Policy': "default-src 'none'; style-src 'unsafe-inline'; img-src data:; frame-src 'self'",
  'X-Content-Type-Options': 'nosniff',
  'Referrer-Policy': 'no-referrer',
  'Cache-Control': 'no-store',
};

/** Names of this machine. Mails hold sign-in links: a page elsewhere must not reach them by a name it points here. */
const ownNames = new Set(['127.0.0.1', 'localhost']);

/** `/` all mails, `/read/<id>` one of them, `/messages?to=<address>` as JSON, newest first. */
export function mailSite(mailbox: Mailbox): RequestListener {
  return (request, response) => {
    const url = new URL(request.url ?? '/', 'http://127.0.0.1');
    if (!isForUs(request)) return answer(response, 403, 'text/plain', 'Open this page as 127.0.0.1.');
    if (request.method !== 'GET') return answer(response, 405, 'text/plain', 'These pages can only be read.');
    if (url.pathname === '/') return answer(response, 200, 'text/html', listPage(mailbox.list()));
    if (url.pathname === '/messages') {
      const messages = mailbox.list(url.searchParams.get('to') ?? undefined);
      return answer(response, 200, 'application/json', JSON.stringify(messages));
    }
    const message = mailbox.find(url.pathname.replace(/^\/read\//, ''));
    if (message) return answer(response, 200, 'text/html', messagePage(message));
    return answer(response, 404, 'text/plain', 'There is no such mail.');
  };
}

const isForUs = ({ headers: { host = '' } }: IncomingMessage): boolean =>
  ownNames.has(host.replace(/:\d+$/, ''));

function answer(response: ServerResponse, status: number, type: string, body: string): void {
  response.writeHead(status, { ...headers, 'Content-Type': `${type}; charset=utf-8` }).end(body);
}
