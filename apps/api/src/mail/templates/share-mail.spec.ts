import { shareMail } from './share-mail';

const url = 'http://thudline.test/s/abc';
const sent = {
  from: 'Juno',
  kind: 'take',
  question: '',
  expiresAt: null,
  hasPassphrase: false,
  url,
} as const;

describe('a mail that brings a link', () => {
  it('says who sends what, and holds the whole link as text and as HTML', () => {
    const { subject, text, html } = shareMail({ ...sent, question: 'Flip it?' });
    expect(subject).toBe('Juno sent you the sheet of a take');
    expect(text).toContain('asks: “Flip it?”');
    expect(text).toContain(`\n${url}\n`);
    expect(html).toContain(`href="${url}"`);
  });

  it('says until when it opens, and that a passphrase comes another way', () => {
    const { text } = shareMail({ ...sent, expiresAt: new Date('2026-12-11T12:00:00Z'), hasPassphrase: true });
    expect(text).toContain('until 11 December');
    expect(text).toContain('asks for a passphrase, which Juno tells you');
    expect(shareMail(sent).text).toContain('until its sender ends it');
    expect(shareMail(sent).text).not.toContain('passphrase');
  });

  it('stays one link and one line of subject, whatever somebody writes', () => {
    const { html } = shareMail({ ...sent, question: '<a href="http://elsewhere.test">free</a>' });
    expect(html.match(/<a /g)).toHaveLength(1);
  });
});
