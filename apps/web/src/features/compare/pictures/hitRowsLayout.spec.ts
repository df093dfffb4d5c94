import type { Hit } from '@thudline/contracts';
import { hitRowsScale, kickTimesS, nearestHit, rowTicks } from './hitRowsLayout';

const hit = (timeS: number, kickPeakDbfs: number | null, kind: Hit['kind'] = 'kick'): Hit => ({
  timeS,
  kind,
  kickPeakDbfs,
  overheadPeakDbfs: -15,
});
const report = { hits: [hit(3, -9), hit(3.5, -30, 'drum'), hit(4, -27), hit(5, null)] };
const scale = hitRowsScale({ zerosS: [3], startS: 0, endS: 10 }, 234);

describe('two rows of hits on one time', () => {
  it('put the first kick at the beginning and leave other drums out', () => {
    expect(kickTimesS(report, 3)).toEqual([0, 1, 2]);
    expect(rowTicks(report, { zeroS: 3, endS: 10, x: scale.x }).map(({ x }) => x)).toEqual([26, 46, 66]);
  });

  it('draw harder hits taller, and the softest still to be seen', () => {
    const heights = rowTicks(report, { zeroS: 3, endS: 10, x: scale.x }).map(({ heightPx }) => heightPx);
    expect(heights).toEqual([19, 7, 7]);
  });

  it('leave out what is no longer heard', () => {
    expect(rowTicks(report, { zeroS: 3, endS: 1.5, x: scale.x })).toHaveLength(2);
  });

  it('find a time by its place, within the axis', () => {
    expect(scale.timeS(scale.x(4.2))).toBeCloseTo(4.2, 9);
    expect(scale.timeS(0)).toBe(0);
    expect(scale.timeS(500)).toBe(10);
  });

  it('choose the nearest hit that both takes have', () => {
    expect(
      nearestHit(
        [
          [0, 1, 2, 3],
          [0, 1.1, 2.2],
        ],
        2.9,
      ),
    ).toBe(2);
    expect(
      nearestHit(
        [
          [0, 1, 2],
          [0, 1.1, 2.2],
        ],
        0.9,
      ),
    ).toBe(1);
  });
});
