import type { ArrivalFacts, PairSpectrum } from '../../facts';
import { delayedPair } from '../../testing/delayedPair';
import { agreement } from './agreement';
import { bestShift } from './bestShift';
import { matchGainDb } from './matchGain';

const arrival = (arrivalMs: number | null, confidence = 1): ArrivalFacts => ({
  arrivalMs,
  arrivalSamples: arrivalMs,
  arrivalIqrMs: 0,
  hitsUsed: 8,
  confidence,
  firstSwing: { kick: 'up', overhead: 'up' },
  reason: null,
});
const balances = Array.from({ length: 8 }, () => ({
  lowEnergy: { kick: 1, overhead: 1, cross: 1 },
  lowCrossLowCut: 1,
  overheadThirdOctavesDbfs: { hz63: -40, hz125: -45 },
}));

describe('agreement of a pair', () => {
  it('says keep of two alike and names every choice against the power sum', () => {
    const facts = agreement({
      spectrum: delayedPair({ delayMs: 1 }),
      balances,
      hitsAlike: 1,
      matchGainDb: 0,
      arrival: arrival(1),
    });
    expect(facts).toMatchObject({ verdict: 'keep', sure: true, agreeingHits: 8, hitsUsed: 8 });
    const named = Object.fromEntries(facts.choices.map((choice) => [choice.name, choice]));
    expect(named['shifted'].lowEndDb).toBeCloseTo(3.0103, 3);
    expect(named['shifted'].deepest?.levelDb).toBeCloseTo(3.0103, 3);
    // Delayed by 1 ms the first null lies at 500 Hz, the third-octave 447–562 Hz.
    expect(named['as-recorded'].deepest?.centreHz).toBeCloseTo(501.187, 3);
    expect(named['best-shift'].shiftMs).toBeCloseTo(1, 1);
    expect(named['best-shift'].flipped).toBe(false);
  });

  it('names the third-octaves a flip would move the other way', () => {
    const facts = agreement({
      spectrum: delayedPair({ delayMs: 1 }),
      balances,
      hitsAlike: 1,
      matchGainDb: 0,
      arrival: arrival(1),
    });
    // Around 500 Hz the two cancel, so there a flip gains though it costs at 30–150 Hz.
    expect(facts.contraryBands.map((band) => Math.round(band.centreHz))).toContain(501);
    expect(facts.contraryBands.every((band) => band.flipGainDb >= 1.5)).toBe(true);
  });

  it('names no third-octave that holds next to nothing, nor one beyond 31.5 Hz to 5 kHz', () => {
    const named = (spectrum: PairSpectrum): number[] =>
      agreement({ spectrum, balances, hitsAlike: 1, matchGainDb: 0, arrival: arrival(1) }).contraryBands.map(
        (band) => Math.round(band.centreHz),
      );
    const pair = delayedPair({ delayMs: 1 });
    // 447–562 Hz is 115 of the 770 Hz from 30 to 800: 15 % of white sound, under 1 % once a hundredth as strong.
    const weak = (values: Float32Array): Float32Array =>
      values.map((value, i) => (i * pair.binHz > 400 && i * pair.binHz < 600 ? value / 100 : value));
    const hollow = { ...pair, skk: weak(pair.skk), soo: weak(pair.soo), skoRe: weak(pair.skoRe) };
    expect(named({ ...hollow, skoIm: weak(pair.skoIm) })).not.toContain(501);
    expect(Math.max(...named(pair))).toBeGreaterThan(2000);
    // Delayed by 20 ms, 25 Hz cancels too and is left out.
    expect(Math.min(...named(delayedPair({ delayMs: 20 })), 1000)).toBeGreaterThan(30);
  });

  it('correlates 1 with itself and −1 with its opposite', () => {
    const pair = delayedPair();
    const opposite = { ...pair, skoRe: pair.skoRe.map((x) => -x) };
    const facts = (spectrum: typeof pair) =>
      agreement({ spectrum, balances, hitsAlike: 1, matchGainDb: 0, arrival: arrival(0) });
    expect(facts(pair).lowCorrelation).toBeCloseTo(1, 6);
    expect(facts(opposite).lowCorrelation).toBeCloseTo(-1, 6);
  });

  it('leaves out shifts without an arrival', () => {
    const facts = agreement({
      spectrum: delayedPair(),
      balances,
      hitsAlike: 1,
      matchGainDb: 0,
      arrival: arrival(null),
    });
    expect(facts.choices.map((choice) => choice.name)).toEqual(['as-recorded', 'flipped']);
  });

  it('says why nothing can be told', () => {
    const none = { balances: [], hitsAlike: null, matchGainDb: null, arrival: arrival(null) };
    expect(agreement({ ...none, spectrum: null })).toMatchObject({
      verdict: 'cannot-tell',
      reason: 'no-kick-hits',
    });
    expect(agreement({ ...none, spectrum: delayedPair() }).reason).toBe('overhead-silent');
  });
});

describe('the best shift', () => {
  const found = (delayMs: number, arrivalFacts: ArrivalFacts) =>
    bestShift(delayedPair({ delayMs }), { arrival: arrivalFacts, gainDb: 0 });

  it('undoes a delay', () => {
    expect(found(2, arrival(2))?.shiftMs).toBeCloseTo(2, 1);
  });

  it('is none without a confident arrival', () => {
    expect(found(2, arrival(null))).toBeNull();
    expect(found(2, arrival(2, 0.4))).toBeNull();
  });

  it('is none at an edge', () => {
    expect(found(4, arrival(2.5))).toBeNull();
    expect(found(-1, arrival(-2))).toBeNull();
  });

  it('is none where it is not worth half a decibel', () => {
    expect(found(0, arrival(0.2))).toBeNull();
    // 0.1 ms costs 0.2 dB at 800 Hz and next to nothing below.
    expect(found(0.1, arrival(0.1))).toBeNull();
  });
});

describe('the gain that matches levels', () => {
  const hit = (kind: 'kick' | 'drum' | 'cymbal', ...peaksDbfs: (number | null)[]) => ({
    timeS: 0,
    kind,
    peaksDbfs,
  });

  it('is the kick peak over the overhead peak at kicks, medians', () => {
    const hits = [hit('kick', -6, -20), hit('kick', -7, -30), hit('kick', -5, -19)];
    expect(matchGainDb(hits, { a: 0, b: 1 })).toBe(14);
  });

  it('is no more than would bring drum hits to the kick peak, and minds no cymbal', () => {
    const hits = [hit('kick', -6, -20), hit('drum', -30, -10), hit('cymbal', -40, -1)];
    expect(matchGainDb(hits, { a: 0, b: 1 })).toBe(4);
  });

  it('is null without kicks or with a silent overhead', () => {
    expect(matchGainDb([hit('drum', -6, -20)], { a: 0, b: 1 })).toBeNull();
    expect(matchGainDb([hit('kick', -6, null)], { a: 0, b: 1 })).toBeNull();
  });
});
