import { middleAndSpread, trendCsv } from './trendFile';

it('a figure over time is kept a take a row, with what it was recorded with', () => {
  const point = { takeId: '01890000-0000-7000-8000-0000000002aa', recordedAt: '2026-10-05T19:40:00.000Z' };
  const setup = { id: point.takeId, name: 'high, over the knee' };
  const points = [
    { ...point, number: 1, value: 0.62, iqr: 0.06, setup },
    { ...point, number: 2, value: -3.5, iqr: null, setup: null },
  ];
  expect(trendCsv({ figure: 'decay-500', points }).split('\r\n')).toEqual([
    'take,recorded at,"decay at 500 Hz, s",between the quartiles,setup',
    '1,2026-10-05T19:40:00.000Z,0.62,0.06,"high, over the knee"',
    '2,2026-10-05T19:40:00.000Z,-3.5,,',
    '',
  ]);
});

it('the middle value and the spread are medians and quartiles', () => {
  expect(middleAndSpread([4, 1, 3, 2, 5])).toEqual({ middle: 3, low: 2, high: 4 });
  expect(middleAndSpread([1, 2])).toEqual({ middle: 1.5, low: 1.25, high: 1.75 });
  expect(middleAndSpread([7])).toEqual({ middle: 7, low: 7, high: 7 });
  expect(middleAndSpread([])).toBeNull();
});
