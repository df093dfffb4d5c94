import { rowLayout } from './rowLayout';

const db = { kind: 'difference', size: 2 } as const;

describe('a row of before and after', () => {
  it('has the middle between the two in its middle, and after on the right where it is more', () => {
    const { beforeX, afterX, barFromX } = rowLayout({ change: 4, interval95: null, step: db }, 200);
    expect((beforeX + afterX) / 2).toBeCloseTo(100, 6);
    expect(afterX).toBeGreaterThan(beforeX);
    expect(barFromX).toBeNull();
  });

  it('draws one step alike in every unit', () => {
    const share = { kind: 'share', size: 0.1 } as const;
    const widthOf = (row: ReturnType<typeof rowLayout>) => row.afterX - row.beforeX;
    const one = rowLayout({ change: 2, interval95: null, step: db }, 200);
    const other = rowLayout({ change: 0.1, interval95: null, step: share }, 200);
    expect(widthOf(one)).toBeCloseTo(widthOf(other), 6);
  });

  it('keeps a wide interval inside', () => {
    const row = rowLayout({ change: -30, interval95: { low: -60, high: 1 }, step: db }, 200);
    for (const x of [row.beforeX, row.afterX, row.barFromX!, row.barToX!]) {
      expect(x).toBeGreaterThanOrEqual(0);
      expect(x).toBeLessThanOrEqual(200);
    }
    expect(rowLayout({ change: null, interval95: null, step: db }, 200).afterX).toBe(100);
  });
});
