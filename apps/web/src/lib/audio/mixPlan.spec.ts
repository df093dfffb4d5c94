import { matchGainsDb, mixPlan, safeGainDb } from './mixPlan';

const asRecorded = { flipped: false, shiftMs: 0, gainDb: 0, matchDb: 0 };

describe('the plan of a mix', () => {
  it('delays both microphones alike as recorded', () => {
    const [branch] = mixPlan([asRecorded, { ...asRecorded, shiftMs: 1.6 }], 0);
    expect(branch.overheadDelayS - branch.kickDelayS).toBe(0);
  });

  it('plays the overhead earlier than the kick by the shift, never before time', () => {
    const plan = mixPlan([asRecorded, { ...asRecorded, shiftMs: 1.6 }, { ...asRecorded, shiftMs: -0.5 }], 0);
    expect(plan[1].kickDelayS - plan[1].overheadDelayS).toBeCloseTo(0.0016, 9);
    expect(plan[2].overheadDelayS - plan[2].kickDelayS).toBeCloseTo(0.0005, 9);
    for (const { kickDelayS, overheadDelayS } of plan) {
      expect(kickDelayS).toBeGreaterThanOrEqual(0);
      expect(overheadDelayS).toBeGreaterThanOrEqual(0);
    }
  });

  it('flips the overhead alone and turns both down by the match', () => {
    const [branch] = mixPlan([{ flipped: true, shiftMs: 0, gainDb: 6, matchDb: -6 }], 0);
    expect(branch.overheadGain).toBeCloseTo(-1, 9);
    expect(branch.kickGain).toBeCloseTo(10 ** (-6 / 20), 9);
  });

  it('keeps the two added below full scale even where both peaks meet', () => {
    const peaks = { kick: -2.7, overhead: -8.4 };
    const safe = 10 ** (safeGainDb(peaks, 5.7) / 20);
    const worst = safe * (10 ** (peaks.kick / 20) + 10 ** ((peaks.overhead + 5.7) / 20));
    expect(worst).toBeCloseTo(1, 9);
    expect(safeGainDb({ kick: -20, overhead: -20 }, 0)).toBe(0);
  });

  it('only ever turns the louder choice down', () => {
    expect(matchGainsDb([0, 0.3, -0.2])).toEqual([-0.2, expect.closeTo(-0.5, 9), 0]);
  });
});
