import type { Hit } from '@thudline/contracts';
import { commonTime, heardStretch } from './commonTime';

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

  it('holds a short take whole, wherever playing begins', () => {
    const time = commonTime([
      { hits: [hit(3.2)], durationS: 16 },
      { hits: [hit(0.02)], durationS: 12 },
    ]);
    const stretch = heardStretch(time, 5);
    expect(stretch).toMatchObject({ startS: -0.06, endS: 12.8, stretches: [{ endS: 16 }, { startS: 0 }] });
    expect(stretch.zerosS[0]).toBeCloseTo(0.06, 9);
    expect(stretch.zerosS[1]).toBeCloseTo(0.02, 9);
    expect(stretch).not.toHaveProperty('goesOnAtS');
  });

  it('holds three minutes of a long take, and goes on from there to its end', () => {
    const time = commonTime([
      { hits: [hit(10)], durationS: 3600 },
      { hits: [hit(4)], durationS: 1000 },
    ]);
    const first = heardStretch(time, 600);
    expect(first).toMatchObject({ startS: 600, endS: 780, goesOnAtS: 780, zerosS: [-600, -600] });
    expect(first.stretches).toEqual([
      { startS: 610, endS: 790 },
      { startS: 604, endS: 784 },
    ]);
    const last = heardStretch(time, 3500);
    expect(last).toMatchObject({ endS: 3590 });
    expect(last).not.toHaveProperty('goesOnAtS');
  });
});
