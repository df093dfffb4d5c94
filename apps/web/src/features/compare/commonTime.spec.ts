import type { Hit } from '@thudline/contracts';
import { commonTime } from './commonTime';

const hit = (timeS: number, kind: Hit['kind'] = 'kick'): Hit => ({
  timeS,
  kind,
  kickPeakDbfs: -9,
  overheadPeakDbfs: -15,
});

describe('one time for two takes', () => {
  it('begins at the first kick hit of each', () => {
    const time = commonTime([
      { hits: [hit(1, 'cymbal'), hit(3.2), hit(4)], durationS: 16 },
      { hits: [hit(2.5), hit(3.3)], durationS: 20 },
    ]);
    expect(time.zerosS).toEqual([3.2, 2.5]);
    expect(time.endS).toBe(17.5);
  });

  it('goes by any hit where there is no kick, and by the beginning where there is no hit', () => {
    const time = commonTime([
      { hits: [hit(1, 'drum')], durationS: 8 },
      { hits: [], durationS: 8 },
    ]);
    expect(time.zerosS).toEqual([1, 0]);
    expect(time.endS).toBe(8);
  });

  it('ends where a long take is no longer heard', () => {
    expect(commonTime([{ hits: [hit(10)], durationS: 3600 }]).endS).toBe(170);
  });
});
