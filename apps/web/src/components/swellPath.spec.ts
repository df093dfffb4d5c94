import { swellPath } from './swellPath';

describe('the swell', () => {
  it('is flat on top over the whole width and as deep as asked', () => {
    const path = swellPath({ widthPx: 100, depthPx: 5, linePx: 2 });
    expect(path.startsWith('M0 0H100V2')).toBe(true);
    const depths = [...path.matchAll(/[\d.]+ ([\d.]+)(?= |C|H|$)/g)].map((match) => Number(match[1]));
    expect(Math.max(...depths)).toBe(7);
  });

  it('swells early and thins out late', () => {
    const path = swellPath({ widthPx: 100, depthPx: 5, linePx: 2 });
    expect(path).toContain('15 7C');
  });
});
