import { SignalError } from '../../assert';
import { delayedPair } from '../../testing/delayedPair';
import { takeFacts, type MadeTake } from '../../testing/takeFacts';
import type { ComparedKey } from './comparedFigure';
import { compareTakes } from './compareTakes';
import { polarityBetween } from './polarityBetween';

const compared = (before: MadeTake, after: MadeTake, gainKnownSame = true) => {
  const figures = compareTakes({
    before: takeFacts({ seed: 1, ...before }),
    after: takeFacts({ seed: 2, ...after }),
    gainKnownSame,
  });
  return (key: ComparedKey) => {
    const figure = figures.find((each) => each.key === key);
    if (!figure) throw new Error(`There is no ${key}.`);
    return figure;
  };
};

describe('two takes compared', () => {
  it.each([true, false])(
    'a take with itself: no clear change in any figure (gain known: %s)',
    (gainKnownSame) => {
      const take = takeFacts();
      const figures = compareTakes({ before: take, after: take, gainKnownSame });
      expect(figures).toHaveLength(17);
      for (const { clear, word, change, interval95, reason, key } of figures) {
        expect([key, clear, word]).toEqual([key, false, null]);
        expect(change).toBe(reason === null ? 0 : null);
        if (interval95) expect(interval95.low <= 0 && interval95.high >= 0).toBe(true);
      }
    },
  );

  it('seldom tells a change where nothing but the playing was done again', () => {
    const told = Array.from({ length: 40 }, (_, i) =>
      compareTakes({
        before: takeFacts({ seed: 10 + i, kicks: 8, drums: 8 }),
        after: takeFacts({ seed: 90 + i, kicks: 8, drums: 8 }),
        gainKnownSame: true,
      }),
    ).flat();
    // 2–3 % with eight hits a side (docs/measurements.md, 8); of 680 figures.
    expect(told.filter((figure) => figure.clear).length / told.length).toBeLessThan(0.03);
  });

  it.each<[ComparedKey, MadeTake, MadeTake, string, number]>([
    ['low-end', { correlation: -0.2 }, { correlation: 0.2 }, 'fuller', 10 * Math.log10(1.2 / 0.8)],
    ['low-end', { correlation: 0.2 }, { correlation: -0.2 }, 'thinner', -10 * Math.log10(1.2 / 0.8)],
    ['hardest-kick', {}, { kickDbfs: -12 }, 'lower', -3],
    ['hardest-overhead', {}, { kickDbfs: -6 }, 'higher', 3],
    ['cymbals-over-drums', {}, { cymbalsLufs: -20 }, 'higher', 4],
    ['arrival', {}, { arrivalMs: 2.2 }, 'later', 0.6],
    ['noise-kick', {}, { noiseDbfs: -60 }, 'noisier', 10],
    ['noise-overhead', {}, { noiseDbfs: -75 }, 'quieter', -5],
    ['evenness', { spreadDb: 0.3 }, { spreadDb: 2 }, 'less even', Math.sqrt(3) * 1.7],
    ['attack', {}, { attackDb: -15 }, 'brighter', 5],
    ['overhead-63', {}, { overhead63Dbfs: -43 }, 'thinner', -3],
    ['overhead-125', {}, { overhead63Dbfs: -37 }, 'fuller', 3],
    ['decay-500', {}, { decayS: 0.5 }, 'longer', 0.25],
    ['decay-4000', {}, { decayS: 0.3 }, 'shorter', -0.25],
  ])('%s from %j to %j is %s', (key, before, after, word, change) => {
    const figure = compared(before, after)(key);
    expect(figure).toMatchObject({ clear: true, word, reason: null });
    // What the seeded hits stray by: a fifth of every change here.
    expect(Math.abs((figure.change ?? NaN) - change)).toBeLessThan(0.2 * Math.abs(change) + 0.1);
    if (figure.interval95) {
      expect(figure.interval95.low).toBeLessThanOrEqual(figure.change ?? NaN);
      expect(figure.interval95.high).toBeGreaterThanOrEqual(figure.change ?? NaN);
    }
  });

  it('tells what strength moves only where the preamps are known to have stood alike', () => {
    const figure = compared({}, { attackDb: -10, overhead63Dbfs: -20, correlation: -0.2 }, false);
    for (const key of ['attack', 'overhead-63', 'overhead-125'] as const) {
      expect(figure(key)).toMatchObject({
        reason: 'strength-unmatched',
        change: null,
        before: null,
        clear: false,
      });
    }
    expect(figure('low-end')).toMatchObject({ reason: null, word: 'thinner' });
    expect(figure('evenness').reason).toBeNull();
  });

  it('leaves out hits struck harder than the other take’s, and says where too few are left', () => {
    // 1 dB about −9 and −16: none within 3 dB of both medians.
    const figure = compared({ kickDbfs: -9 }, { kickDbfs: -16 });
    expect(figure('attack').reason).toBe('strength-unmatched');
    expect(figure('low-end')).toMatchObject({ reason: null, hitsBefore: 16, hitsAfter: 16 });
    const some = compared({ kickDbfs: -9, spreadDb: 2 }, { kickDbfs: -11, spreadDb: 2 })('attack');
    expect(some.reason).toBeNull();
    expect(some.hitsBefore).toBeLessThan(16);
  });

  it('needs six hits a side', () => {
    const figure = compared({ kicks: 5, drums: 5 }, {});
    for (const key of [
      'low-end',
      'attack',
      'evenness',
      'decay-500',
      'cymbals-over-drums',
      'brightness',
    ] as const) {
      expect([key, figure(key).reason, figure(key).word]).toEqual([key, 'too-few-hits', null]);
    }
    expect(figure('decay-500')).toMatchObject({ hitsBefore: 5, hitsAfter: 12 });
    expect(Math.abs((figure('decay-500').before ?? NaN) - 0.4)).toBeLessThan(0.03);
  });

  it('says what a take doesn’t hold, and what was measured before it was', () => {
    expect(compared({ noiseDbfs: null }, {})('noise-kick')).toMatchObject({
      reason: 'cannot-tell',
      after: -70,
    });
    const old = compared({ hitsKept: false }, {});
    for (const key of [
      'low-end',
      'attack',
      'overhead-63',
      'decay-1000',
      'brightness',
      'cymbals-over-drums',
    ] as const) {
      expect([key, old(key).reason]).toEqual([key, 'not-measured']);
    }
    expect(old('evenness').reason).toBeNull();
    expect(() =>
      compareTakes({ before: { ...takeFacts(), pairs: [] }, after: takeFacts(), gainKnownSame: true }),
    ).toThrow(SignalError);
  });

  it('holds no number that is none, whatever the takes', () => {
    const takes = [
      {},
      { kicks: 0, drums: 0 },
      { kicks: 1, drums: 1 },
      { correlation: -1, correlationSpread: 0 },
    ];
    for (const before of takes) {
      for (const after of takes) {
        const figures = compareTakes({
          before: takeFacts(before),
          after: takeFacts(after),
          gainKnownSame: true,
        });
        const text = JSON.stringify(figures);
        // JSON turns what is no number into null, which no interval may hold.
        expect(JSON.parse(text)).toEqual(figures);
      }
    }
  });
});

describe('the polarity between two takes', () => {
  const between = (before: MadeTake, after: MadeTake, gain = -1) =>
    polarityBetween({
      before: takeFacts({ seed: 1, ...before }),
      after: takeFacts({ seed: 2, ...after }),
      spectra: { before: delayedPair({ delayMs: 1.6 }), after: delayedPair({ delayMs: 1.6, gain }) },
    });

  it('counts the hits that turned over', () => {
    expect(between({ correlation: -0.2 }, { correlation: 0.2 })).toEqual({
      likeness: expect.closeTo(-1, 5) as number,
      seen: 'flipped',
      hits: 16,
      turnedHits: 16,
    });
    expect(between({}, {}, 1)).toMatchObject({ seen: 'as-before', hits: 16, turnedHits: 0 });
    // Single hits stray to both sides of zero.
    const astray = between({ correlation: -0.2 }, { correlation: 0.02, correlationSpread: 0.05 });
    expect(astray.turnedHits).toBeGreaterThan(4);
    expect(astray.turnedHits).toBeLessThan(16);
  });

  it('can’t be told without kick hits', () => {
    const nothing = polarityBetween({
      before: takeFacts({ kicks: 0 }),
      after: takeFacts(),
      spectra: { before: null, after: delayedPair() },
    });
    expect(nothing).toEqual({ likeness: null, seen: null, hits: 16, turnedHits: 0 });
  });
});
