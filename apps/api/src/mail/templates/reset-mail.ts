import { linkMail, MailContent } from './mail-content';

export function resetMail({ name, url }: { name: string; url: string }): MailContent {
  return linkMail({
    subject: 'A new password for Thudline',
    greeting: `Hello ${name},`,
    request: 'somebody asked for a new password for your account. Open the link to choose one.',
    link: { words: 'Choose a new password', url },
    remark:
      'The link works once, within an hour. If it was not you, ignore this mail: your password stays as it is.',
  });
}
