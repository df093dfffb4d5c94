import { ordersOfDay } from './ordersOfDay';

const change = (number: number, happenedOn: string, rank = 0) => ({
  id: `c${number}`,
  number,
  happenedOn,
  rank,
});
const [first, second, third, other] = [
  change(2, '2026-11-02'),
  change(3, '2026-11-02'),
  change(4, '2026-11-02'),
  change(1, '2026-10-01'),
];
const log = [third, second, first, other];

describe('the changes of one day', () => {
  it('change places with their neighbour', () => {
    expect(ordersOfDay(log, second)).toEqual({
      earlier: [
        { id: 'c2', rank: 1 },
        { id: 'c4', rank: 2 },
      ],
      later: [
        { id: 'c4', rank: 1 },
        { id: 'c3', rank: 2 },
      ],
    });
  });

  it('go no further than the day', () => {
    expect(Object.keys(ordersOfDay(log, first))).toEqual(['later']);
    expect(Object.keys(ordersOfDay(log, third))).toEqual(['earlier']);
    expect(ordersOfDay(log, other)).toEqual({});
  });

  it('send only what has to change', () => {
    const ranked = [change(2, '2026-11-02', 0), change(3, '2026-11-02', 1), change(4, '2026-11-02', 2)];
    expect(ordersOfDay(ranked, ranked[2]).earlier).toEqual([
      { id: 'c4', rank: 1 },
      { id: 'c3', rank: 2 },
    ]);
  });
});
