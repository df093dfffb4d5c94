import { escapeHtml } from '../../text/escape-html';

export interface MailContent {
  subject: string;
  text: string;
  html: string;
}

interface LinkMail {
  subject: string;
  greeting: string;
  /** Stands above the link. */
  request: string;
  /** Words of somebody else, between the request and the link. */
  quote?: string[];
  link: { words: string; url: string };
  /** How long the link is good for, and what to do if nobody asked. */
  remark: string;
}

/** A mail that asks for one thing: to open a link. The same words as text and as HTML. */
export function linkMail({ subject, greeting, request, quote = [], link, remark }: LinkMail): MailContent {
  const paragraphs = [greeting, request];
  const cited = quote.map((words) => words.replace(/^/gm, '> '));
  return {
    subject,
    text: [...paragraphs, ...cited, link.url, remark, 'Thudline'].join('\n\n') + '\n',
    html: [
      '<div style="font-family: sans-serif; font-size: 16px; line-height: 1.5; max-width: 36em">',
      ...paragraphs.map((paragraph) => `<p>${escapeHtml(paragraph)}</p>`),
      ...quote.map(
        (words) =>
          `<blockquote style="margin: 0 0 1em; padding-left: 1em; border-left: 2px solid #C98F86; white-space: pre-line">${escapeHtml(words)}</blockquote>`,
      ),
      `<p><a href="${escapeHtml(link.url)}">${escapeHtml(link.words)}</a></p>`,
      `<p>${escapeHtml(remark)}</p>`,
      '<p>Thudline</p>',
      '</div>',
    ].join('\n'),
  };
}
