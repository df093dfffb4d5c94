import { linkMail, MailContent } from './mail-content';

export function joinInvitationMail({
  from,
  days,
  url,
}: {
  from: string;
  days: number;
  url: string;
}): MailContent {
  return linkMail({
    subject: `${from} invites you to Thudline`,
    greeting: 'Hello,',
    request: `${from} lets you join Thudline with this address. It measures drum takes recorded with two microphones, and says what to change before the next one.`,
    link: { words: 'Join', url },
    remark: `The link is good for ${days} days. If you don’t want to join, ignore this mail.`,
  });
}
