import { verdictOf, type VerdictEvidence } from './verdict';

const clear: VerdictEvidence = {
  hits: 8,
  agreeingHits: 8,
  hitsAlike: 0.97,
  arrivalIqrMs: 0.1,
  arrives: true,
  flipGainDb: 1.4,
  bandGainsDb: [1.3, 1.4, 2.1],
};
const verdict = (change: Partial<VerdictEvidence> = {}) => verdictOf({ ...clear, ...change });

describe('the verdict', () => {
  it('is flip where flipping gains, keep where it costs', () => {
    expect(verdict()).toEqual({ verdict: 'flip', sure: true, reason: null });
    expect(verdict({ flipGainDb: -1.4, bandGainsDb: [-1.3, -1.4, -2.1] })).toMatchObject({
      verdict: 'keep',
      sure: true,
    });
  });

  it('is either way under half a decibel', () => {
    expect(verdict({ flipGainDb: 0.49, bandGainsDb: [0.4, 0.49, 0.6] }).verdict).toBe('either-way');
    expect(verdict({ flipGainDb: -0.5, bandGainsDb: [-0.4, -0.5, -0.6] }).verdict).toBe('keep');
  });

  it('is unsure from half a decibel to one', () => {
    expect(verdict({ flipGainDb: 0.99, bandGainsDb: [0.9, 0.99, 1.2] })).toMatchObject({
      verdict: 'flip',
      sure: false,
    });
    expect(verdict({ flipGainDb: 1, bandGainsDb: [0.9, 1, 1.2] }).sure).toBe(true);
  });

  it('is unsure with fewer than three hits', () => {
    expect(verdict({ hits: 2, agreeingHits: 2 })).toMatchObject({ verdict: 'flip', sure: false });
    expect(verdict({ hits: 3, agreeingHits: 3 }).sure).toBe(true);
  });

  it('is unsure where the three low bands differ in sign', () => {
    expect(verdict({ bandGainsDb: [-0.3, 1.4, 1.5] })).toMatchObject({ verdict: 'flip', sure: false });
  });

  it("can't be told without a kick hit or with a silent overhead", () => {
    expect(verdict({ hits: 0, agreeingHits: 0 }).reason).toBe('no-kick-hits');
    expect(verdict({ flipGainDb: null, bandGainsDb: [] }).reason).toBe('overhead-silent');
  });

  it("can't be told where fewer than three in four hits agree", () => {
    expect(verdict({ agreeingHits: 5 })).toEqual({
      verdict: 'cannot-tell',
      sure: false,
      reason: 'hits-disagree',
    });
    expect(verdict({ agreeingHits: 6 }).verdict).toBe('flip');
  });

  it("can't be told where the hits are no more alike than chance makes them", () => {
    // 1.5/√8 = 0.530.
    expect(verdict({ hitsAlike: 0.53 })).toEqual({
      verdict: 'cannot-tell',
      sure: false,
      reason: 'hits-unlike',
    });
    expect(verdict({ hitsAlike: 0.54 }).verdict).toBe('flip');
    expect(verdict({ hitsAlike: null }).verdict).toBe('flip');
    expect(verdict({ hits: 3, agreeingHits: 3, hitsAlike: 0.86 }).reason).toBe('hits-unlike');
    expect(verdict({ hits: 2, agreeingHits: 2, hitsAlike: 0.5 })).toMatchObject({
      verdict: 'flip',
      sure: false,
    });
  });

  it("can't be told where the arrival spreads by more than a millisecond or isn't there", () => {
    expect(verdict({ arrivalIqrMs: 1.01 }).reason).toBe('arrival-spread');
    expect(verdict({ arrivalIqrMs: 1 }).verdict).toBe('flip');
    expect(verdict({ arrivalIqrMs: null }).verdict).toBe('flip');
    expect(verdict({ arrives: false }).reason).toBe('arrival-spread');
  });

  it("can't be told where the low bands are more than 2 dB apart and say different things", () => {
    expect(verdict({ bandGainsDb: [-0.8, 1.4, 1.5] }).reason).toBe('bands-disagree');
    expect(verdict({ bandGainsDb: [1.1, 1.4, 3.2] }).verdict).toBe('flip');
  });
});
