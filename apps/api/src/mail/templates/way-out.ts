import { MailChoice } from '@thudline/contracts';
import { escapeHtml } from '../../text/escape-html';
import { MailContent } from './mail-content';

const reasons: Record<MailChoice, string> = {
  notes: 'when somebody leaves a note or answers one',
  sent: 'when somebody sends you a sheet',
  opened: 'when a sheet you sent is opened for the first time',
  digest: 'once a week',
};

/** The same mail with its reason at the foot, and the page on which it is stopped. */
export function withWayOut(
  { subject, text, html }: MailContent,
  choice: MailChoice,
  url: string,
): MailContent {
  const reason = `You get this ${reasons[choice]}.`;
  return {
    subject,
    text: `${text}\n-- \n${reason} Stop these mails: ${url}\n`,
    html: `${html}\n<p style="font-family: sans-serif; font-size: 13px; color: #565D62">${escapeHtml(reason)} <a href="${escapeHtml(url)}">Stop these mails</a></p>`,
  };
}
