import { doneWords, oldestFirst, takeNumbers, typedTags } from './chosenTakes';

const takes = (...numbers: number[]) => numbers.map((number) => ({ number }));

describe('several takes in words', () => {
  it('names them in order', () => {
    expect(takeNumbers(takes(12))).toBe('take 12');
    expect(takeNumbers(takes(14, 12))).toBe('takes 12 and 14');
    expect(takeNumbers(takes(5, 4, 3, 2, 1))).toBe('takes 1, 2, 3, 4 and 5');
  });

  it('counts what would make a long row of numbers', () => {
    expect(takeNumbers(takes(1, 2, 3, 4, 5, 6))).toBe('takes 1, 2, 3, 4 and 2 more');
  });

  it('says what became of them', () => {
    expect(doneWords(takes(12), 'deleted')).toBe('Take 12 is deleted.');
    expect(doneWords(takes(12, 14), 'back')).toBe('Takes 12 and 14 are back.');
  });
});

it('reads tags with commas between, each once', () => {
  expect(typedTags(' rug, blankets ,, rug')).toEqual(['rug', 'blankets']);
  expect(typedTags('  ')).toEqual([]);
});

it('puts takes in the order they were recorded in, whatever their numbers', () => {
  const take = (number: number, recordedAt: string) => ({
    id: String(number),
    number,
    recordedAt,
    deletedAt: null,
  });
  const takes = [
    take(3, '2026-11-01T10:00:00Z'),
    take(2, '2026-11-03T10:00:00Z'),
    take(1, '2026-11-03T10:00:00Z'),
  ];
  expect(oldestFirst(takes).map(({ number }) => number)).toEqual([3, 1, 2]);
});
