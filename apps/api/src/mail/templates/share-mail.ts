import { ShareKind } from '@thudline/contracts';
import { linkMail, MailContent } from './mail-content';

interface SentShare {
  /** Who sends it. */
  from: string;
  kind: ShareKind;
  question: string;
  expiresAt: Date | null;
  hasPassphrase: boolean;
  url: string;
}

const whatWords: Record<ShareKind, string> = {
  take: 'the sheet of a take',
  comparison: 'a comparison of two takes',
  'try-out': 'a try-out',
  room: 'a room’s log',
};

const day = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', timeZone: 'UTC' });

export function shareMail({ from, kind, question, expiresAt, hasPassphrase, url }: SentShare): MailContent {
  const asks = question ? ` and asks: “${question}”` : '.';
  return linkMail({
    subject: `${from} sent you ${whatWords[kind]}`,
    greeting: 'Hello,',
    request: `${from} recorded drums, had them measured with Thudline, sends you ${whatWords[kind]}${asks}`,
    link: { words: 'Open it', url },
    remark: [
      'No account is needed.',
      expiresAt
        ? `The link opens it until ${day.format(expiresAt)}.`
        : 'The link opens it until its sender ends it.',
      hasPassphrase && `It asks for a passphrase, which ${from} tells you.`,
      `If you don’t know ${from}, ignore this mail.`,
    ]
      .filter(Boolean)
      .join(' '),
  });
}
