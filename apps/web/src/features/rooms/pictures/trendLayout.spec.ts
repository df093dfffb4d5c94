import { movedView, spread, trendLayout, valueScale, wholeTime } from './trendLayout';

const size = { widthPx: 500, topPx: 50, heightPx: 100, leftPx: 40, rightPx: 10 };
const point = (day: string, value: number, iqr: number | null = 0.04) => ({
  takeId: day,
  number: 1,
  recordedAt: `2026-${day}T12:00:00.000Z`,
  value,
  iqr,
  setup: null,
});
const change = (number: number, day: string) => ({ number, happenedOn: `2026-${day}`, what: 'x' });

describe('a figure over time', () => {
  const points = [point('10-05', 0.6), point('10-20', 0.62), point('12-01', 0.5)];
  const layout = trendLayout(points, [change(2, '12-05'), change(1, '11-30')], size);

  it('lies inside the picture, later further right, larger further up', () => {
    const xs = layout.points.map(({ x }) => x);
    expect(xs).toEqual([...xs].sort((a, b) => a - b));
    for (const { x, y, lowY, highY } of layout.points) {
      expect(x).toBeGreaterThan(40);
      expect(x).toBeLessThan(490);
      expect(highY).toBeLessThan(y);
      expect(lowY).toBeGreaterThan(y);
      expect(highY).toBeGreaterThanOrEqual(50);
      expect(lowY).toBeLessThanOrEqual(150);
    }
    expect(layout.points[1].y).toBeLessThan(layout.points[0].y);
  });

  it('has a middle value between changes and none where no take lies', () => {
    expect(layout.spans).toHaveLength(2);
    const [before, after] = layout.spans;
    expect(before.middleY).toBeCloseTo((layout.points[0].y + layout.points[1].y) / 2, 6);
    expect(before.toX).toBeCloseTo(layout.verticals[0].x, 6);
    expect(after.middleY).toBeCloseTo(layout.points[2].y, 6);
  });

  it('marks the change that no take follows', () => {
    expect(layout.verticals.map(({ change: { number }, hasTakesAfter }) => [number, hasTakesAfter])).toEqual([
      [1, true],
      [2, false],
    ]);
  });

  it('names the months that begin in it', () => {
    expect(layout.months.map(({ at }) => at.toISOString().slice(0, 10))).toEqual([
      '2026-11-01',
      '2026-12-01',
    ]);
  });

  it('seen nearer shows what lies in that time, its middle value cut at the edges', () => {
    const view = { fromMs: Date.parse('2026-10-15'), toMs: Date.parse('2026-11-10') };
    const near = trendLayout(points, [change(1, '11-30')], size, view);
    expect(near.points.map(({ point: { value } }) => value)).toEqual([0.62]);
    expect(near.verticals).toEqual([]);
    expect(near.spans).toHaveLength(1);
    expect(near.spans[0].fromX).toBe(40);
    expect(near.spans[0].toX).toBe(490);
  });

  it('leaves room for a change’s name up to the next number', () => {
    const [first, second] = layout.verticals;
    expect(first.roomPx).toBeCloseTo(second.labelX - first.labelX - 26, 6);
  });

  it('draws a single take without a spread', () => {
    const single = trendLayout([point('10-05', -61, null)], [], size);
    expect(single.points[0].lowY).toBe(single.points[0].y);
    for (const value of [single.points[0].x, single.points[0].y, single.spans[0].toX])
      expect(Number.isFinite(value)).toBe(true);
  });
});

describe('the time that is shown', () => {
  const dayMs = 86_400_000;
  const whole = wholeTime([point('10-01', 1), point('12-01', 1)], []);

  it('comes nearer around its middle, no nearer than two days, and goes no wider than all', () => {
    const near = movedView(whole, whole, { factor: 0.5 });
    expect(near.toMs - near.fromMs).toBeCloseTo((whole.toMs - whole.fromMs) / 2, 3);
    expect((near.fromMs + near.toMs) / 2).toBeCloseTo((whole.fromMs + whole.toMs) / 2, 3);
    const nearest = movedView(whole, whole, { factor: 1e-6 });
    expect(nearest.toMs - nearest.fromMs).toBeCloseTo(2 * dayMs, 3);
    expect(movedView(near, whole, { factor: 9 })).toEqual(whole);
  });

  it('moves along and stays inside', () => {
    const near = movedView(whole, whole, { factor: 0.25 });
    const later = movedView(near, whole, { shift: 0.5 });
    expect(later.fromMs - near.fromMs).toBeCloseTo((near.toMs - near.fromMs) / 2, 3);
    expect(movedView(near, whole, { shift: 99 }).toMs).toBeCloseTo(whole.toMs, 3);
  });
});

it.each([
  [[0.49, 0.62], 3, 6],
  [[-61, -52], 3, 6],
  [[0, 0], 3, 6],
])('%j stand on three to six round ticks', (values, least, most) => {
  const { ticks, min, max } = valueScale(values.map((value) => ({ value, iqr: 0 })));
  expect(ticks.length).toBeGreaterThanOrEqual(least);
  expect(ticks.length).toBeLessThanOrEqual(most);
  expect(min).toBeLessThanOrEqual(Math.min(...values));
  expect(max).toBeGreaterThanOrEqual(Math.max(...values));
});

it('numbers keep apart and stay inside', () => {
  const placed = spread([100, 102, 104, 495], 500);
  for (let i = 1; i < placed.length; i++) expect(placed[i] - placed[i - 1]).toBeGreaterThanOrEqual(26);
  expect(placed.at(-1)).toBeLessThanOrEqual(487);
  expect(spread([], 500)).toEqual([]);
});
