import { takeFacts, type MadeTake } from '../../testing/takeFacts';
import { rankTryOut, type RankTryOutOptions } from './rankTryOut';

const ranked = (takes: readonly MadeTake[], options: Partial<RankTryOutOptions> = {}) =>
  rankTryOut(
    takes.map((made, i) => ({ facts: takeFacts({ seed: 5 + i, ...made }) })),
    { measure: 'low-end', choiceRule: 'as-recorded', ...options },
  );
const standings = (takes: readonly MadeTake[], options: Partial<RankTryOutOptions> = {}) =>
  ranked(takes, options).takes.map(({ standing }) => standing);

describe('a try-out ranked', () => {
  it('by low end is in the order it was made in, with the best named', () => {
    const { takes, bestIndex, unit, step } = ranked(
      [-0.4, 0.3, 0, 0.28].map((correlation) => ({ correlation })),
    );
    expect([bestIndex, unit, step]).toEqual([1, 'dB', 0.5]);
    expect(takes.map(({ rank }) => rank)).toEqual([4, 1, 3, 2]);
    expect(takes.map(({ word }) => word)).toEqual([
      'clearly thinner',
      'fullest',
      'clearly thinner',
      'no clear difference',
    ]);
    // Matched levels: kick alone 1, both 2 + 2·r. Single hits stray by 0.03 of the correlation.
    [-0.4, 0.3, 0, 0.28].forEach((r, i) => {
      expect(Math.abs((takes[i].value ?? NaN) - 10 * Math.log10(2 + 2 * r))).toBeLessThan(0.2);
    });
    expect(takes[3].fromBest).toBeCloseTo((takes[3].value ?? NaN) - (takes[1].value ?? NaN), 9);
    expect(takes[1]).toMatchObject({ fromBest: 0, standing: 'best', flipped: false, hits: 16, reason: null });
  });

  it('follows the rule for the polarity', () => {
    const takes = [{ correlation: -0.4 }, { correlation: 0.3 }];
    expect(ranked(takes, { choiceRule: 'best-polarity' })).toMatchObject({
      bestIndex: 0,
      takes: [{ flipped: true }, { flipped: false }],
    });
    expect(ranked(takes, { choiceRule: 'flipped' })).toMatchObject({
      bestIndex: 0,
      takes: [{ flipped: true }, { flipped: true }],
    });
    const { takes: agreeing, bestIndex } = ranked(takes, {
      measure: 'agreement',
      choiceRule: 'best-polarity',
    });
    expect(bestIndex).toBe(0);
    expect(Math.abs((agreeing[0].value ?? NaN) - 0.4)).toBeLessThan(0.05);
  });

  it('by the interval of the difference, not by whether two intervals overlap', () => {
    // 0.55 dB apart: the intervals nearly touch or overlap, their difference is sure.
    const takes = [0.2, 0.37].map((correlation) => ({ correlation, correlationSpread: 0.09, kicks: 40 }));
    const { takes: told } = ranked(takes);
    expect(told[0].fromBestInterval95?.high).toBeLessThan(0);
    expect(told[0].standing).toBe('worse');
  });

  it.each([
    ['bleed', [{ drumInKickDbfs: -20 }, { drumInKickDbfs: -30 }], ['worse', 'best']],
    ['evenness', [{ spreadDb: 0.3 }, { spreadDb: 2 }], ['best', 'worse']],
    ['attack', [{ attackDb: -20 }, { attackDb: -14 }], ['worse', 'best']],
  ] as const)('by %s, where the lower or the higher is the better', (measure, takes, expected) => {
    expect(standings(takes, { measure })).toEqual(expected);
  });

  it('calls takes alike that are', () => {
    const alike = standings([{}, {}, {}, {}, {}, {}]);
    expect(alike.filter((standing) => standing === 'as-good')).toHaveLength(5);
  });

  it('of two weighted measures lies between them', () => {
    // Much fuller but a little softer in attack.
    const takes = [
      { correlation: 0.4, attackDb: -22 },
      { correlation: 0, attackDb: -20 },
    ];
    const share = (of: number) => ranked(takes, { and: { measure: 'attack', share: of } });
    expect([share(0), share(1)].map(({ bestIndex }) => bestIndex)).toEqual([0, 1]);
    expect(share(0.5)).toMatchObject({ unit: 'steps', step: 1, higherIsBetter: true });
    // Low end 1.46 dB are 2.9 steps, attack 2 dB are 2: half of each is 0.46 to the first.
    expect(Math.abs((share(0.5).takes[1].fromBest ?? NaN) + 0.46)).toBeLessThan(0.4);
  });

  it('shows but doesn’t rank what has too few hits, and leaves out what was measured before', () => {
    const { takes, bestIndex } = ranked([
      { kicks: 5, correlation: 0.9 },
      {},
      { hitsKept: false },
      { kicks: 0 },
    ]);
    expect(bestIndex).toBe(1);
    expect(takes.map(({ reason }) => reason)).toEqual(['too-few-hits', null, 'not-measured', 'too-few-hits']);
    expect(takes[0]).toMatchObject({ rank: null, standing: null, word: null });
    expect(takes[0].value).toBeGreaterThan(2);
    expect(takes[3].value).toBeNull();
    expect(ranked([{ kicks: 2 }]).bestIndex).toBeNull();
  });

  it('tells attack only of hits about as hard as the other takes’', () => {
    const takes = [{ kickDbfs: -9 }, { kickDbfs: -9 }, { kickDbfs: -18 }];
    const told = ranked(takes, { measure: 'attack' });
    expect(told.takes.map(({ reason }) => reason)).toEqual([null, null, 'strength-unmatched']);
    expect(ranked(takes).takes.map(({ reason }) => reason)).toEqual([null, null, null]);
  });
});
