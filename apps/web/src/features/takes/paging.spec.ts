import { pageAfter, pagePlace, rangeWords } from './paging';
import { everyTake, takesQuery } from './takesQuery';

const place = (query: string) => pagePlace(new URLSearchParams(query));

describe('pages of takes', () => {
  it('begins with the newest', () => {
    expect(place('')).toEqual({ cursor: null, firstRow: 1 });
    expect(rangeWords(place(''), 11, 15)).toBe('1–11 of 15');
  });
  it('carries cursor and row number in the address of the next page', () => {
    const older = pageAfter(everyTake, { nextCursor: 'a b+c', place: place(''), shownRows: 11 });
    const next = place(older.split('?')[1]);
    expect(next).toEqual({ cursor: 'a b+c', firstRow: 12 });
    expect(rangeWords(next, 4, 15)).toBe('12–15 of 15');
  });
  it('keeps the filter sentence on the next page', () => {
    const query = { ...everyTake, show: 'hot', tag: 'rug' } as const;
    const older = pageAfter(query, { nextCursor: 'c1', place: place(''), shownRows: 11 });
    expect(takesQuery(new URLSearchParams(older.split('?')[1]))).toEqual(query);
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
