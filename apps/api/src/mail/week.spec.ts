import { weekEnd } from './week';

describe('the end of a week', () => {
  it.each([
    ['Monday at six itself', '2026-11-30T06:00:00.000Z', '2026-11-30T06:00:00.000Z'],
    ['a moment before', '2026-11-30T05:59:59.999Z', '2026-11-23T06:00:00.000Z'],
    ['Sunday night', '2026-12-06T23:00:00.000Z', '2026-11-30T06:00:00.000Z'],
  ])('on %s', (_, now, end) => {
    expect(weekEnd(new Date(now)).toISOString()).toBe(end);
    expect(weekEnd(new Date(now)).getUTCDay()).toBe(1);
  });
});
