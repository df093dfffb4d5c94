import { kickHitsOf, loudestHit, nearestHit } from './kickHits';

const hit = (timeS: number, kind: 'kick' | 'drum', kickPeakDbfs: number) => ({
  timeS,
  kind,
  kickPeakDbfs,
  overheadPeakDbfs: -12,
});
const report = {
  hits: [
    hit(1, 'drum', -40),
    hit(2, 'kick', -9),
    hit(3, 'drum', -41),
    hit(3.4, 'kick', -4),
    hit(5, 'kick', -6),
  ],
};
const kicks = kickHitsOf(report);

describe('the hit the sheet looks at', () => {
  it('begins with the loudest kick', () => {
    expect(kicks).toEqual([1, 3, 4]);
    expect(loudestHit(report, kicks)).toBe(3);
  });

  it('is the kick nearest to whatever was chosen', () => {
    expect(nearestHit(report, kicks, 0)).toBe(1);
    expect(nearestHit(report, kicks, 2)).toBe(3);
    expect(nearestHit(report, kicks, 4)).toBe(4);
  });

  it('is none where there is no kick', () => {
    expect(loudestHit(report, [])).toBeNull();
  });
});
