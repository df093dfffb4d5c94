import {
  axisStartDbfs,
  changeLabel,
  dotSizes,
  isClippedHit,
  rowHeightPx,
  stackDots,
  ticksDbfs,
} from './hitStripLayout';

const target = { lowDbfs: -12, highDbfs: -6, aimDbfs: -9 };
const x = (dbfs: number) => 96 + ((dbfs + 24) / 24) * 574;

describe('the hit line', () => {
  it('shows −24 to 0 dBFS, and lower in steps of 6 only when a hit is lower', () => {
    expect(axisStartDbfs([-10, -3], target)).toBe(-24);
    expect(axisStartDbfs([-31], target)).toBe(-36);
    expect(axisStartDbfs([-200], target)).toBe(-60);
  });

  it('marks every 6 dB, or every 12 where there is no room', () => {
    expect(ticksDbfs(-24, 704)).toEqual([-24, -18, -12, -6, 0]);
    expect(ticksDbfs(-48, 320)).toEqual([-48, -36, -24, -12, 0]);
  });

  it('puts every dot at its own level and stacks those that would cover each other', () => {
    const hits = [-6, -6.05, -6.1, -14, -2.7].map((peakDbfs, index) => ({ index, peakDbfs, clipped: false }));
    const dots = stackDots(hits, x);
    for (const dot of dots) expect(dot.x).toBe(x(dot.peakDbfs));
    for (const a of dots)
      for (const b of dots) {
        if (a === b) continue;
        const apart = Math.hypot(a.x - b.x, (a.row - b.row) * rowHeightPx);
        expect(apart).toBeGreaterThan(2 * dotSizes.dotRadiusPx);
      }
  });

  it('makes the hardest hit the large dot, on the line', () => {
    const dots = stackDots(
      [
        { index: 0, peakDbfs: -9, clipped: false },
        { index: 1, peakDbfs: -2.7, clipped: false },
      ],
      x,
    );
    expect(dots.filter((dot) => dot.hardest)).toEqual([expect.objectContaining({ index: 1, row: 0 })]);
  });

  it('puts clipped hits beyond the edge, since their level is not known', () => {
    const hits = [0, -0.05, -3].map((peakDbfs, index) => ({
      index,
      peakDbfs,
      clipped: isClippedHit(peakDbfs, true),
    }));
    const dots = stackDots(hits, x);
    expect(
      dots
        .filter((dot) => dot.x > x(0))
        .map((dot) => dot.index)
        .sort(),
    ).toEqual([0, 1]);
    expect(isClippedHit(-0.05, false)).toBe(false);
  });

  it('tells the change in half decibels, and at least for a clipped take', () => {
    expect(changeLabel(-6.3, false)).toBe('down 6.5 dB');
    expect(changeLabel(5, false)).toBe('up 5 dB');
    expect(changeLabel(0.1, false)).toBe('up 0.5 dB');
    expect(changeLabel(-9, true)).toBe('down at least 9 dB');
  });
});
