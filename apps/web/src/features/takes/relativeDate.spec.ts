import { relativeDate } from './relativeDate';

/** In the time zone the tests run in, like a reader's own clock. */
const at = (year: number, month: number, day: number, hour = 12, minute = 0) =>
  new Date(year, month - 1, day, hour, minute);

describe('when a take was recorded', () => {
  const now = at(2026, 12, 1, 20, 0);
  it.each([
    ['just now', at(2026, 12, 1, 20, 0)],
    ['a minute ago', at(2026, 12, 1, 19, 59)],
    ['9 minutes ago', at(2026, 12, 1, 19, 51)],
    ['today 19:40', at(2026, 12, 1, 19, 40)],
    ['today 00:05', at(2026, 12, 1, 0, 5)],
    ['yesterday', at(2026, 11, 30, 23, 59)],
    ['29 Nov', at(2026, 11, 29, 23, 59)],
    ['31 Dec 2025', at(2025, 12, 31)],
    ['today 21:00', at(2026, 12, 1, 21, 0)],
  ])('says "%s"', (words, then) => {
    expect(relativeDate(then.toISOString(), now)).toBe(words);
  });

  it('says minutes across midnight', () => {
    expect(relativeDate(at(2026, 11, 30, 23, 58).toISOString(), at(2026, 12, 1, 0, 2))).toBe('4 minutes ago');
  });
});
