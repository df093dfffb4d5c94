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
  link: { words: string; url: string };
  /** How long the link is good for, and what to do if nobody asked. */
  remark: string;
}

/** A mail that asks for one thing: to open a link. The same words as text and as HTML. */
export function linkMail({ subject, greeting, request, link, remark }: LinkMail): MailContent {
  const paragraphs = [greeting, request];
  return {
    subject,
    text: [...paragraphs, link.url, remark, 'Thudline'].join('\n\n') + '\n',
    html: [
      '<div style="font-family: sans-serif; font-size: 16px; line-height: 1.5; max-width: 36em">',
      ...paragraphs.map((paragraph) => `<p>${escapeHtml(paragraph)}</p>`),
      `<p><a href="${escapeHtml(link.url)}">${escapeHtml(link.words)}</a></p>`,
      `<p>${escapeHtml(remark)}</p>`,
      '<p>Thudline</p>',
      '</div>',
    ].join('\n'),
  };
}
