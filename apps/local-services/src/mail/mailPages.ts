import { type KeptMessage } from './keptMessage';

const style = `
  body { margin: 0 auto; padding: 24px; max-width: 760px; font: 17px/1.5 sans-serif; color-scheme: light dark }
  table { width: 100%; border-collapse: collapse } td, th { text-align: left; padding: 8px 12px 8px 0;
  border-bottom: 1px solid #8886; vertical-align: top } pre { white-space: pre-wrap; font: inherit }
  iframe { width: 100%; height: 560px; border: 1px solid #8886; background: #fff }`;

const escapes: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};
const escaped = (text: string): string =>
  text.replace(/[&<>"']/g, (character) => escapes[character] ?? character);

const page = (title: string, body: string): string =>
  `<!doctype html><html lang="en"><head><meta charset="utf-8"><title>${escaped(title)}</title>` +
  `<meta name="viewport" content="width=device-width"><style>${style}</style></head><body>${body}</body></html>`;

/** All mails of this machine, newest first. */
export function listPage(messages: KeptMessage[]): string {
  const rows = messages.map(
    ({ id, receivedAt, to, subject }) =>
      `<tr><td>${escaped(receivedAt.replace('T', ' ').slice(0, 19))}</td><td>${escaped(to.join(', '))}</td>` +
      `<td><a href="/read/${encodeURIComponent(id)}">${escaped(subject || 'no subject')}</a></td></tr>`,
  );
  const table = `<table><tr><th>received, UTC</th><th>to</th><th>subject</th></tr>${rows.join('')}</table>`;
  const empty = '<p>No mail yet. What Thudline sends on this machine arrives here.</p>';
  return page('Mail on this machine', `<h1>Mail on this machine</h1>${rows.length ? table : empty}`);
}

/**
 * One mail. Its HTML stands in a frame without scripts and without our origin; its links open beside it.
 */
export function messagePage({ subject, from, to, receivedAt, text, html }: KeptMessage): string {
  const frame = html
    ? '<h2>As HTML</h2><iframe title="The mail as HTML" sandbox="allow-popups allow-popups-to-escape-sandbox" ' +
      `srcdoc="${escaped(`<base target="_blank">${html}`)}"></iframe>`
    : '';
  return page(
    subject || 'no subject',
    `<p><a href="/">All mail</a></p><h1>${escaped(subject || 'no subject')}</h1>` +
      `<p>from ${escaped(from)}<br>to ${escaped(to.join(', '))}<br>${escaped(receivedAt)}</p>` +
      `<h2>As text</h2><pre>${escaped(text)}</pre>${frame}`,
  );
}
