import { linkMail, MailContent } from './mail-content';

export function verifyMail({ name, url }: { name: string; url: string }): MailContent {
  return linkMail({
    subject: 'Is this your address?',
    greeting: `Hello ${name},`,
    request: 'you joined Thudline with this address. Open the link to say that it is yours.',
    link: { words: 'This is my address', url },
    remark: 'The link is good for 7 days. If you did not join, ignore this mail.',
  });
}
