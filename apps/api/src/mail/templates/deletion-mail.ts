import { linkMail, MailContent } from './mail-content';

/** Mails have no time zone of their reader's, so the day is UTC's. */
const day = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' });

export function deletionMail({
  name,
  deleteAfter,
  url,
}: {
  name: string;
  deleteAfter: Date;
  url: string;
}): MailContent {
  return linkMail({
    subject: 'Your Thudline account will be deleted',
    greeting: `Hello ${name},`,
    request: `your account goes on ${day.format(deleteAfter)}, with every take, room, note and link. Until then you can change your mind: sign in and keep it.`,
    link: { words: 'Keep the account', url },
    remark: 'If it was not you who asked for this, sign in, keep the account, and set a new password.',
  });
}
