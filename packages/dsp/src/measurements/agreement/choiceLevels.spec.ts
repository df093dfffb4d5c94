import { delayedPair } from '../../testing/delayedPair';
import { choiceLowEnd, flipGain, listeningMatchDb, thirdOctaveLevels, zoneLevels } from './choiceLevels';

const choice = { flipped: false, shiftMs: 0, gainDb: 0 };
/** One bin's width around a frequency: what a closed form at that frequency can be compared with. */
const at = (hz: number) => ({ lowHz: hz - 1.4, highHz: hz + 1.4 });
/** Level of the sum against the louder of two equal sounds: the power sum lies 3.01 dB above one of them. */
const overOne = (levelDb: number | null): number => (levelDb ?? NaN) + 10 * Math.log10(2);

describe('two microphones added', () => {
  it('gain 6.02 dB over one of them when they are the same', () => {
    // Master Handbook of Acoustics p. 201: 20 lg 2.
    expect(overOne(choiceLowEnd(delayedPair(), choice))).toBeCloseTo(6.0206, 3);
  });

  it('reach at most 3.01 dB over their power sum', () => {
    expect(choiceLowEnd(delayedPair(), choice)).toBeCloseTo(3.0103, 4);
  });

  // Closed form 20·lg(2·cos(φ/2)); φ = 360·f·t at 100 Hz. ±0.02 dB: the bins that make
  // up "100 Hz" span 2.8 Hz.
  it.each([
    [30, 5.7195],
    [60, 4.7712],
    [90, 3.0103],
    [120, 0],
    [135, -2.3226],
  ])('add at %i degrees as the closed form says', (degrees, levelDb) => {
    const delayMs = (degrees / 360 / 100) * 1000;
    expect(Math.abs(overOne(choiceLowEnd(delayedPair({ delayMs }), choice, at(100))) - levelDb)).toBeLessThan(
      0.02,
    );
  });

  it('comb at 1 ms: nulls at 500 and 1500 Hz, peaks at 1 and 2 kHz', () => {
    // Master Handbook of Acoustics pp. 188, 201.
    const pair = delayedPair({ delayMs: 1 });
    for (const hz of [500, 1500]) expect(choiceLowEnd(pair, choice, at(hz))).toBeLessThan(-35);
    for (const hz of [1000, 2000]) expect(choiceLowEnd(pair, choice, at(hz))).toBeCloseTo(3.0103, 2);
  });

  it('differ by 20·lg of (1 + r)/(1 − r) between the polarities when one is r times the other', () => {
    // 20·lg(1 ± r): r = 0.5 gives +3.522 and −6.021 dB.
    expect(flipGain(delayedPair({ gain: 0.5 }), { gainDb: 0 })).toBeCloseTo(-6.021 - 3.522, 2);
  });

  it('are 3.01 dB over one when they know nothing of each other', () => {
    const pair = { ...delayedPair(), skoRe: new Float32Array(4097), skoIm: new Float32Array(4097) };
    expect(overOne(choiceLowEnd(pair, choice))).toBeCloseTo(3.0103, 4);
    expect(flipGain(pair, { gainDb: 0 })).toBeCloseTo(0, 9);
  });
});

describe('a choice', () => {
  it('that plays the overhead earlier by its delay makes the two the same again', () => {
    const pair = delayedPair({ delayMs: 2.3 });
    expect(choiceLowEnd(pair, { ...choice, shiftMs: 2.3 }, { lowHz: 30, highHz: 800 })).toBeCloseTo(
      3.0103,
      3,
    );
  });

  it('that flips turns full addition into a null, and stays finite', () => {
    const levelDb = choiceLowEnd(delayedPair(), { ...choice, flipped: true });
    expect(levelDb).toBeLessThan(-60);
    expect(Number.isFinite(levelDb)).toBe(true);
  });

  it('that turns the overhead up by what it lacks matches the two', () => {
    const pair = delayedPair({ gain: 0.5 });
    expect(choiceLowEnd(pair, { ...choice, gainDb: 20 * Math.log10(2) })).toBeCloseTo(3.0103, 4);
  });

  it('changes sign but not size of the flip when the overhead is inverted', () => {
    const pair = delayedPair({ delayMs: 1.1, gain: 0.7 });
    const inverted = { ...pair, skoRe: pair.skoRe.map((x) => -x), skoIm: pair.skoIm.map((x) => -x) };
    const gain = flipGain(pair, { gainDb: 3 }) ?? NaN;
    expect(flipGain(inverted, { gainDb: 3 })).toBeCloseTo(-gain, 9);
  });

  it('never changes the sign of a flip by its gain', () => {
    const pair = delayedPair({ delayMs: 4, gain: 0.3 });
    const signs = [-40, -10, 0, 10, 40].map((gainDb) => Math.sign(flipGain(pair, { gainDb }) ?? 0));
    expect(new Set(signs).size).toBe(1);
  });
});

describe('levels by band', () => {
  it('cover 25 Hz to 10 kHz and the five zones', () => {
    const pair = delayedPair({ delayMs: 0.1 });
    expect(
      thirdOctaveLevels(pair, choice)
        .map((band) => band.nominal)
        .at(0),
    ).toBe('25');
    expect(thirdOctaveLevels(pair, choice)).toHaveLength(27);
    expect(zoneLevels(pair, choice)).toHaveLength(5);
  });

  it('are null where neither microphone has anything', () => {
    const none = new Float32Array(100);
    const silent = { binHz: 3, hitCount: 1, skk: none, soo: none, skoRe: none, skoIm: none };
    expect(choiceLowEnd(silent, choice)).toBeNull();
    expect(thirdOctaveLevels(silent, choice).every((band) => band.levelDb === null)).toBe(true);
    expect(flipGain(silent, { gainDb: 0 })).toBeNull();
  });

  it('match two choices by what is above the low end', () => {
    // With a gain of 0 dB against −∞ (nearly): the sum of two equal sounds is 6.02 dB over one of them.
    const alone = { ...choice, gainDb: -200 };
    expect(listeningMatchDb(delayedPair(), choice, alone)).toBeCloseTo(6.0206, 3);
    expect(listeningMatchDb(delayedPair(), alone, choice)).toBeCloseTo(-6.0206, 3);
  });
});
