import { linkMail, MailContent } from './mail-content';

export function openedMail({
  name,
  what,
  url,
}: {
  name: string;
  /** "the sheet of take 14", "a link". */
  what: string;
  url: string;
}): MailContent {
  return linkMail({
    subject: `${what.charAt(0).toUpperCase()}${what.slice(1)} was opened`,
    greeting: `Hello ${name},`,
    request: `somebody opened ${what} that you sent, for the first time.`,
    link: { words: 'Go there', url },
    remark: 'You hear of the first time only.',
  });
}
