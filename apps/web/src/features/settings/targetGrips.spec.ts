import { target as targetSchema } from '@thudline/contracts';
import { gripLimits, moveGrip, usualTarget, type Grip } from './targetGrips';

describe('moving a grip', () => {
  it('snaps to half a decibel', () => {
    expect(moveGrip(usualTarget, 'lowDbfs', -13.26)).toEqual({ lowDbfs: -13.5, highDbfs: -6, aimDbfs: -9 });
    expect(moveGrip(usualTarget, 'highDbfs', -5.2)).toEqual({ lowDbfs: -12, highDbfs: -5, aimDbfs: -9 });
  });

  it('keeps the aim inside the target', () => {
    expect(moveGrip(usualTarget, 'aimDbfs', -3)).toEqual({ lowDbfs: -12, highDbfs: -6, aimDbfs: -6 });
    expect(moveGrip(usualTarget, 'aimDbfs', -30).aimDbfs).toBe(-12);
  });

  it('takes the aim along where an end passes it', () => {
    expect(moveGrip(usualTarget, 'lowDbfs', -8)).toEqual({ lowDbfs: -8, highDbfs: -6, aimDbfs: -8 });
    expect(moveGrip(usualTarget, 'highDbfs', -11)).toEqual({ lowDbfs: -12, highDbfs: -11, aimDbfs: -11 });
  });

  it('never lets the ends meet', () => {
    expect(moveGrip(usualTarget, 'lowDbfs', 0).lowDbfs).toBe(-6.5);
    expect(moveGrip(usualTarget, 'highDbfs', -40).highDbfs).toBe(-11.5);
  });

  it.each<[Grip, number]>([
    ['lowDbfs', -99],
    ['lowDbfs', 99],
    ['highDbfs', -99],
    ['highDbfs', 99],
    ['aimDbfs', -99],
    ['aimDbfs', 99],
  ])('ends in a target that the server takes: %s to %d', (grip, dbfs) => {
    const moved = moveGrip(usualTarget, grip, dbfs);
    expect(targetSchema.safeParse(moved).success).toBe(true);
    const { minDbfs, maxDbfs } = gripLimits(usualTarget, grip);
    expect(moved[grip]).toBe(dbfs < 0 ? minDbfs : maxDbfs);
  });
});
