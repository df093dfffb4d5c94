import { addressNoticeMail } from './address-notice-mail';
import { deletionMail } from './deletion-mail';
import { newAddressMail } from './new-address-mail';
import { resetMail } from './reset-mail';
import { verifyMail } from './verify-mail';

const url = 'http://thudline.test/verify/abc?x=1&y=2';

describe.each([
  ['to verify an address', verifyMail],
  ['to choose a new password', resetMail],
  ['to confirm another address', newAddressMail],
  [
    'that another address is asked for',
    (to: { name: string; url: string }) => addressNoticeMail({ ...to, newEmail: 'new@example.org' }),
  ],
  [
    'that an account goes',
    (to: { name: string; url: string }) =>
      deletionMail({ ...to, deleteAfter: new Date('2026-12-08T09:00:00Z') }),
  ],
])('a mail %s', (_what, template) => {
  it('says the same as text and as HTML, with the whole link in both', () => {
    const { subject, text, html } = template({ name: 'Juno', url });
    expect(subject.length).toBeGreaterThan(10);
    expect(text).toContain('Hello Juno,');
    expect(text).toContain(`\n${url}\n`);
    expect(html).toContain('<p>Hello Juno,</p>');
    expect(html).toContain('href="http://thudline.test/verify/abc?x=1&amp;y=2"');
  });

  it('stays a mail, whatever somebody calls themselves', () => {
    const { html } = template({ name: '<a href="http://elsewhere.test">free</a>', url });
    expect(html.match(/<a /g)).toHaveLength(1);
  });
});
