import { tryOutPlotLayout, type PlotPoint } from './tryOutPlotLayout';

const point = (id: string, value: number, changed: Partial<PlotPoint> = {}): PlotPoint => ({
  id,
  value,
  interval: { low: value - 0.2, high: value + 0.2 },
  position: null,
  mark: 'plain',
  asGood: false,
  ...changed,
});
const five = [
  point('80', 0.4, { position: 80 }),
  point('90', 1.1, { position: 90, mark: 'now' }),
  point('100', 1.9, { position: 100, mark: 'best', asGood: true }),
  point('110', 1.7, { position: 110, asGood: true }),
  point('120', 0.8, { position: 120 }),
];
const layout = (points = five, widthPx = 704, showsZero = true) =>
  tryOutPlotLayout({ points, widthPx, showsZero });

describe('the plot of a try-out', () => {
  it('puts positions to scale across and values up', () => {
    const { marks } = layout();
    const steps = marks.slice(1).map(({ x }, i) => x - marks[i].x);
    for (const step of steps) expect(step).toBeCloseTo(steps[0], 6);
    const closer = layout([
      point('a', 1, { position: 0 }),
      point('b', 1, { position: 1 }),
      point('c', 1, { position: 10 }),
    ]);
    expect(closer.marks[1].x - closer.marks[0].x).toBeLessThan(closer.marks[2].x - closer.marks[1].x);
    expect(marks[2].y).toBeLessThan(marks[0].y);
    expect(marks[2].highY).toBeLessThan(marks[2].y);
    expect(marks[2].lowY).toBeGreaterThan(marks[2].y);
  });

  it('puts what has no number side by side, in its order', () => {
    const { marks, left, right } = layout([point('felt', 1), point('wood', 2, { position: 3 })]);
    expect(marks.map(({ x }) => x)).toEqual([left + (right - left) / 4, left + (3 * (right - left)) / 4]);
  });

  it('has round numbers on its axis, zero where zero says something', () => {
    expect(layout().ticks.map(({ value }) => value)).toEqual([0, 0.5, 1, 1.5, 2, 2.5]);
    expect(layout().zeroY).toBe(layout().bottom);
    const bleed = layout([point('a', -18.2), point('b', -17.1)], 704, false);
    expect(bleed.zeroY).toBeNull();
    expect(bleed.ticks[0].value).toBeLessThanOrEqual(-18.4);
    expect(bleed.ticks.at(-1)?.value).toBeGreaterThanOrEqual(-16.9);
    expect(layout([point('alone', 0, { interval: null })]).ticks.length).toBeGreaterThan(1);
  });

  it('has a band that holds what is as good as the best, and nothing that is clearly worse', () => {
    const { band, marks } = layout();
    const inside = (y: number) => y >= band!.top - 1e-6 && y <= band!.bottom + 1e-6;
    expect(marks.filter(({ y }) => inside(y)).map(({ id }) => id)).toEqual(['100', '110']);
    const near = layout([
      point('best', 2, { mark: 'best', asGood: true }),
      point('unsure', 1, { asGood: true, interval: { low: -2, high: 4 } }),
      point('worse', 1.9, {}),
    ]);
    expect(near.marks[2].y).toBeGreaterThan(near.band!.bottom);
  });

  it('has an arrow from now to the best, unless that is the same take', () => {
    expect(layout().arrow?.path).toMatch(/^M[\d.]+ [\d.]+C/);
    expect(layout(five.filter(({ mark }) => mark !== 'now')).arrow).toBeNull();
  });

  it('keeps every mark inside, and words only where they fit', () => {
    for (const widthPx of [280, 324, 704]) {
      const { marks, left, right } = layout(five, widthPx);
      for (const { x } of marks) expect(x > left && x < right).toBe(true);
    }
    expect(layout(five, 704).marks.map(({ words }) => words)).toEqual(Array(5).fill('beside'));
  });

  it('writes every figure over its bar on a phone, and gives ring and disc two lines for their words', () => {
    const phone = layout(five, 324);
    expect(phone.marks.map(({ words }) => words)).toEqual(Array(5).fill('over'));
    expect(phone.marks.every(({ isNamed }) => isNamed)).toBe(true);
    expect(phone.marks.map(({ belowRow }) => belowRow)).toEqual([0, 0, 1, 0, 0]);
    expect(phone.heightPx).toBeGreaterThan(layout(five, 704).heightPx);
  });

  it('names only the ends, ring and disc where twelve stand close', () => {
    const twelve = Array.from({ length: 12 }, (_, i) =>
      point(String(i), 1 + i / 10, {
        position: 40 + 6 * i,
        mark: i === 5 ? 'now' : i === 11 ? 'best' : 'plain',
        asGood: i === 11,
      }),
    );
    const { marks } = layout(twelve, 324);
    const named = marks.filter(({ isNamed }) => isNamed).map(({ id }) => id);
    expect(named).toEqual(['0', '5', '11']);
    expect(marks.filter(({ words }) => words === 'over').map(({ id }) => id)).toEqual(['5', '11']);
  });
});
