import { olderPage, pagePlace, rangeWords } from './paging';

const place = (query: string) => pagePlace(new URLSearchParams(query));

describe('pages of takes', () => {
  it('begins with the newest', () => {
    expect(place('')).toEqual({ cursor: null, firstRow: 1 });
    expect(rangeWords(place(''), 11, 15)).toBe('1–11 of 15');
  });
  it('carries cursor and row number in the address of the next page', () => {
    const older = olderPage('a b+c', place(''), 11);
    const next = place(older.split('?')[1]);
    expect(next).toEqual({ cursor: 'a b+c', firstRow: 12 });
    expect(rangeWords(next, 4, 15)).toBe('12–15 of 15');
  });
  it('says a single row once', () => {
    expect(rangeWords({ cursor: 'x', firstRow: 12 }, 1, 12)).toBe('12 of 12');
  });
  it.each(['after=x', 'after=x&from=nonsense', 'after=x&from=-3', 'after=x&from=1.5'])(
    'survives "%s"',
    (query) => {
      expect(place(query)).toEqual({ cursor: 'x', firstRow: 1 });
    },
  );
});
