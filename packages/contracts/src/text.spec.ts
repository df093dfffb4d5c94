import { text, textOfLines } from './text';

/** Written as escapes, so that this file shows them. */
const unseen = ['a\u0000b', 'a\u0007b', 'a\u001bb', 'a\u007fb', 'a\u0085b', 'a\ud800b', 'a\udc00b'];

describe('text', () => {
  it('keeps every alphabet and pictures, without the spaces around it', () => {
    for (const written of ['Kick "1", 100 %', 'ドラム', 'قرع', '🥁 and 👩‍🎤'])
      expect(text().parse(`  ${written}\n`)).toBe(written);
  });

  it.each([...unseen, 'a\nb', 'a\tb'])('refuses %j in a sentence', (written) => {
    expect(text().safeParse(written).error?.issues).toMatchObject([
      { message: 'Write it in one line, without characters that nobody sees.' },
    ]);
  });

  it('says its own sentence for what is no text', () => {
    expect(text('Write a name.').safeParse(3).error?.issues).toMatchObject([{ message: 'Write a name.' }]);
  });
});

describe('text of several lines', () => {
  it('keeps lines and tabs, and ends each line alike', () => {
    expect(textOfLines().parse('one\r\ntwo\rthree\n\tfour\n')).toBe('one\ntwo\nthree\n\tfour');
  });

  it.each(unseen)('refuses %j in a sentence', (written) => {
    expect(textOfLines().safeParse(written).error?.issues).toMatchObject([
      { message: 'Leave out the characters that nobody sees.' },
    ]);
  });
});
