import { NoteMail, noteMail, tickedMail } from './note-mail';

const url = 'http://thudline.test/takes/1#note-2';
const mail = (changed: Partial<NoteMail> = {}) =>
  noteMail({
    kind: 'note',
    name: 'Juno',
    from: 'Bex',
    take: { number: 14, title: 'felt' },
    pin: { kind: 'take' },
    body: 'Yes. Leave it there.',
    nextItems: [],
    url,
    ...changed,
  });

describe('a mail about a note', () => {
  it('says who wrote what about which take, and leads to it', () => {
    const { subject, text, html } = mail({ body: 'Yes.\nLeave it.', nextItems: ['Flip it'] });
    expect(subject).toBe('Bex wrote on take 14');
    expect(text).toContain(
      'Bex wrote on take 14 (felt):\n\n> Yes.\n> Leave it.\n\n> To do next: Flip it\n\n',
    );
    expect(text).toContain(`\n${url}\n`);
    expect(html).toContain('Leave it.</blockquote>');
  });

  it.each([
    [{ kind: 'answer' as const }, 'Bex answered on take 14 (felt):'],
    [{ pin: { kind: 'finding' as const, topic: 'adding-up' as const } }, ', about Adding up:'],
    [{ pin: { kind: 'hit' as const, timeS: 64.26 } }, ', about 1:04.3:'],
    [{ take: { number: 3, title: '' } }, 'on take 3:'],
  ])('tells what it is about: %j', (changed, words) => {
    expect(mail(changed).text).toContain(words);
  });

  it('carries no address of somebody else’s page, whatever a guest writes', () => {
    const { text, html } = mail({
      from: 'Bex',
      body: 'Win at https://evil.test/x?y or www.evil.test, evil.test/a, javascript://evil',
      nextItems: ['See http://evil.test'],
    });
    expect(text).not.toMatch(/evil/);
    expect(html.match(/<a /g)).toHaveLength(1);
  });

  it('leaves levels, times and sentences as they are', () => {
    const body = 'Turn it down 6.5 dB. At 0:04.3 it clips, e.g. there.Then rest';
    expect(mail({ body }).text).toContain('Turn it down 6.5 dB. At 0:04.3 it clips, e.g. ');
  });

  it('stays a mail, whatever is in it, and a short one', () => {
    const { html } = mail({ from: '<b>Bex</b>', body: '<img src=x onerror=alert(1)>' });
    expect(html).not.toMatch(/<img|<b>/);
    expect(mail({ body: 'x'.repeat(4000) }).text.length).toBeLessThan(1000);
  });
});

describe('a mail about what was ticked', () => {
  it('tells whoever asked what is done', () => {
    const take = { number: 14, title: '' };
    const { subject, text } = tickedMail({
      name: 'Oda',
      player: 'Juno',
      take,
      done: ['Flip it', 'Rest'],
      url,
    });
    expect(subject).toBe('Juno did what you asked for');
    expect(text).toContain('Juno ticked on take 14:\n\n> Flip it\n\n> Rest\n');
  });
});
