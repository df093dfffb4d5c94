import { csv } from './export-sheets';
import { differentNames } from './export-contents';

describe('a table for a spreadsheet', () => {
  it('has names first, and quotes what would break a line', () => {
    const rows = [{ take: 1, title: 'Loud, "in" front', at: new Date('2026-12-01T10:00:00Z') }];
    expect(csv(rows, ['take', 'title', 'at'])).toBe(
      'take,title,at\r\n1,"Loud, ""in"" front",2026-12-01T10:00:00.000Z\r\n',
    );
  });

  it('leaves nothing where nothing is known, and numbers as they are', () => {
    expect(csv([{ a: null, b: -9.5, c: false }], ['a', 'b', 'c', 'd'])).toBe('a,b,c,d\r\n,-9.5,false,\r\n');
  });

  it('is never taken for a formula', () => {
    for (const title of ['=1+1', '+1', '-1', '@x'])
      expect(csv([{ title }], ['title'])).toBe(`title\r\n'${title}\r\n`);
  });
});

describe('names in one folder', () => {
  it('differ, also where only their case does not', () => {
    expect(differentNames(['kick.wav', 'Kick.wav', 'oh.wav', 'kick.wav'])).toEqual([
      'kick.wav',
      '2 Kick.wav',
      'oh.wav',
      '3 kick.wav',
    ]);
  });
});
