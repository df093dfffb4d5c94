import type { TakeProgress } from '@thudline/contracts';
import { pointsOf, weeksOf, weekStart } from '../progressFigures';
import { progressLayout } from './progressLayout';

const take = (number: number, day: string, levelSpreadDb: number | null): TakeProgress => ({
  takeId: String(number),
  number,
  title: '',
  recordedAt: `${day}T12:00:00.000Z`,
  levelSpreadDb,
  cymbalsOverDrumsDb: null,
  headroomDb: null,
  clipped: levelSpreadDb === null,
});
const takes = [
  take(1, '2026-10-05', 2),
  take(2, '2026-10-11', 5),
  take(3, '2026-10-12', null),
  take(4, '2026-11-10', 3),
];
const points = pointsOf(takes, 'level-spread');
const size = { widthPx: 704, topPx: 10, heightPx: 100, leftPx: 50, rightPx: 10 };

describe('weeks of progress', () => {
  it('begin on Monday', () => {
    for (const day of ['2026-10-05T00:00:00Z', '2026-10-11T23:59:59Z'])
      expect(new Date(weekStart(Date.parse(day))).toISOString()).toBe('2026-10-05T00:00:00.000Z');
  });

  it('have the middle of their takes; a week without any is left out', () => {
    expect(weeksOf(points).map(({ middle }) => middle)).toEqual([3.5, 3]);
  });
});

describe('the picture of progress', () => {
  it('lies inside, with each take in its week', () => {
    const layout = progressLayout(points, [{ number: 3, timeMs: Date.parse(takes[2].recordedAt) }], size);
    for (const { x, y } of [...layout.points, ...layout.crosses]) {
      expect(x).toBeGreaterThanOrEqual(50);
      expect(x).toBeLessThanOrEqual(694);
      expect(y).toBeGreaterThanOrEqual(10);
      expect(y).toBeLessThanOrEqual(110);
    }
    expect(layout.points[0].x).toBeGreaterThan(layout.weeks[0].fromX);
    expect(layout.points[1].x).toBeLessThan(layout.weeks[0].toX);
    expect(layout.crosses[0].x).toBeGreaterThan(layout.weeks[0].toX);
    expect(layout.months.map(({ at }) => at.toISOString().slice(0, 10))).toEqual(['2026-11-01']);
  });

  it('is drawn of a single take, too', () => {
    const { points: drawn, ticks } = progressLayout(points.slice(0, 1), [], size);
    expect(drawn[0].x).toBeGreaterThan(50);
    expect(ticks.length).toBeGreaterThan(2);
  });
});
