import { linkMail, MailContent } from './mail-content';

export function addressNoticeMail({
  name,
  newEmail,
  url,
}: {
  name: string;
  newEmail: string;
  url: string;
}): MailContent {
  return linkMail({
    subject: 'Your address at Thudline is about to change',
    greeting: `Hello ${name},`,
    request: `somebody who knows your password asked to use ${newEmail} for your account instead of this address.`,
    link: { words: 'Set a new password', url },
    remark:
      'If it was you, there is nothing to do here: open the link in the mail to the new address. If it was not you, set a new password now; that stops it.',
  });
}
