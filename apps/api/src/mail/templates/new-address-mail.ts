import { linkMail, MailContent } from './mail-content';

export function newAddressMail({ name, url }: { name: string; url: string }): MailContent {
  return linkMail({
    subject: 'Is this your new address?',
    greeting: `Hello ${name},`,
    request:
      'you asked to use this address for your Thudline account. Open the link to say that it is yours.',
    link: { words: 'Use this address', url },
    remark:
      'The link works once, within a day. Until then the old address stays. If it was not you, ignore this mail.',
  });
}
