import { sampleListItem } from '../../testing/sampleList';
import { takeLevel, targetCount } from './targetCount';
import { usualTarget } from './targetGrips';

const take = (number: number, kickPeakDbfs: number | null, change = {}) =>
  sampleListItem({ number, kickPeakDbfs, overheadPeakDbfs: -9, ...change });
const said = (takes: ReturnType<typeof take>[], everyTotal = takes.length, target = usualTarget) => {
  const { strong, rest } = targetCount(takes, target, everyTotal);
  return `${strong} ${rest}`;
};

describe('the level of a take', () => {
  it('is that of its worse microphone', () => {
    expect(takeLevel(take(1, -9), usualTarget)).toBe('on-target');
    expect(takeLevel(take(1, -9, { overheadPeakDbfs: -14 }), usualTarget)).toBe('low');
    expect(takeLevel(take(1, -2, { overheadPeakDbfs: -14 }), usualTarget)).toBe('hot');
    expect(takeLevel(take(1, null, { kickClipped: true }), usualTarget)).toBe('clipped');
  });

  it('counts the ends of the target to it', () => {
    expect(takeLevel(take(1, -12), usualTarget)).toBe('on-target');
    expect(takeLevel(take(1, -6), usualTarget)).toBe('on-target');
  });

  it('can’t be told without a hit', () => {
    expect(takeLevel(take(1, null, { overheadPeakDbfs: null }), usualTarget)).toBeNull();
  });
});

describe('how a target fits the takes', () => {
  const good = [1, 2, 3].map((number) => take(number, -9));

  it('names those that miss it', () => {
    expect(said([...good, take(11, -14), take(14, -2.7), take(13, null, { kickClipped: true })])).toBe(
      '3 of your 6 takes are on target. Take 11 is low, take 14 hot, take 13 clipped.',
    );
    expect(said([...good, take(15, -2), take(14, -2.7)])).toBe(
      '3 of your 5 takes are on target. Takes 14 and 15 are hot.',
    );
  });

  it('follows the target', () => {
    const narrow = { lowDbfs: -10, highDbfs: -9.5, aimDbfs: -10 };
    expect(said(good, 3, narrow)).toBe('none of your 3 takes is on target. Takes 1, 2 and 3 are hot.');
    expect(said(good)).toBe('all your 3 takes are on target.');
  });

  it('leaves out takes without a hit', () => {
    expect(said([...good, take(4, null, { overheadPeakDbfs: null })])).toBe(
      'all your 3 takes are on target.',
    );
  });

  it('speaks of one take as one', () => {
    expect(said([take(1, -9)])).toBe('your take is on target.');
    expect(said([take(1, -3)])).toBe('your take is not on target. Take 1 is hot.');
    expect(said([take(1, -9), take(2, -3)])).toBe('1 of your 2 takes is on target. Take 2 is hot.');
  });

  it('says so where there are more takes than were counted', () => {
    expect(said([...good, take(4, -3)], 140)).toBe('3 of your newest 4 takes are on target. Take 4 is hot.');
  });
});
