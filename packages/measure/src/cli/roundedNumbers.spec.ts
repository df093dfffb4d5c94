import { roundedNumbers } from './roundedNumbers';

it('rounds levels, milliseconds and metres to 4 decimals and the rest to 6', () => {
  const report = {
    levelDbfs: -2.666666666,
    arrivalMs: 1.63265306,
    dcOffset: 0.0000034999,
    name: 'kick',
    runs: [{ atS: 1 / 3 }],
  };
  expect(roundedNumbers(report)).toEqual({
    levelDbfs: -2.6667,
    arrivalMs: 1.6327,
    dcOffset: 0.000003,
    name: 'kick',
    runs: [{ atS: 0.333333 }],
  });
  expect(report.arrivalMs).toBe(1.63265306);
});

it('keeps null and leaves no negative zero', () => {
  const { gainDb, none } = roundedNumbers({ gainDb: -0.00001, none: null });
  expect(Object.is(gainDb, 0)).toBe(true);
  expect(none).toBeNull();
});
