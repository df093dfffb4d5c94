import { SignalError } from '../../assert';
import type { HitFacts, PairSpectrum } from '../../facts';
import { delayedPair } from '../../testing/delayedPair';
import { smallKit } from '../../testing/smallKit';
import { attackDb } from './attack';
import { bleedDb, evennessDb, lowEndOverKickDb } from './tryOutFigures';

const asRecorded = { flipped: false, shiftMs: 0, gainDb: 0 };
const hit = (kind: HitFacts['kind'], kickDbfs: number | null): HitFacts => ({
  timeS: 0,
  kind,
  peaksDbfs: [kickDbfs, -10],
});

describe('the low end the overhead brings', () => {
  it('is 6.02 dB for two alike, and nothing for a silent overhead', () => {
    const alike = delayedPair({ delayMs: 0, gain: 1 });
    expect(lowEndOverKickDb(alike, asRecorded)).toBeCloseTo(6.0206, 3);
    const silent: PairSpectrum = {
      ...alike,
      soo: alike.soo.map(() => 0),
      skoRe: alike.skoRe.map(() => 0),
      skoIm: alike.skoIm.map(() => 0),
    };
    expect(lowEndOverKickDb(silent, asRecorded)).toBeCloseTo(0, 9);
    expect(lowEndOverKickDb({ ...silent, skk: silent.soo }, asRecorded)).toBeNull();
  });

  it('is far below the kick alone where a flip cancels, and follows the gain', () => {
    const alike = delayedPair({ delayMs: 0, gain: 0.5 });
    // 20·lg(1 − 0.5) and 20·lg(1 + 0.5), closed forms.
    expect(lowEndOverKickDb(alike, { ...asRecorded, flipped: true })).toBeCloseTo(-6.0206, 3);
    expect(lowEndOverKickDb(alike, asRecorded)).toBeCloseTo(3.5218, 3);
    expect(lowEndOverKickDb(alike, { ...asRecorded, gainDb: 6.0206 })).toBeCloseTo(6.0206, 3);
  });
});

describe('bleed and evenness', () => {
  it('are medians and quartiles of the kick file’s peaks', () => {
    const hits = [-8, -9, -10, -11].map((peak) => hit('kick', peak));
    const others = [hit('drum', -30), hit('drum', -34), hit('cymbal', -50), hit('drum', null)];
    expect(bleedDb([...hits, ...others], 0)).toBe(-32 + 9.5);
    expect(evennessDb([...hits, ...others], 0)).toBe(1.5);
  });

  it('can’t be told without hits', () => {
    expect(bleedDb([hit('kick', -9)], 0)).toBeNull();
    expect(bleedDb([hit('drum', -9)], 0)).toBeNull();
    expect(evennessDb([hit('kick', -9), hit('drum', -9)], 0)).toBeNull();
  });
});

describe('the attack of a kick', () => {
  const { kick, kickAt, sampleRateHz } = smallKit({ kicks: 1 });
  const [startAt] = kickAt;
  const read = (samples: Float32Array) => attackDb(samples, { sampleRateHz, startAt }) ?? NaN;

  it('rises by as much as the click is added', () => {
    const click = (gain: number) =>
      kick.map((x, i) => {
        const s = (i - startAt) / sampleRateHz;
        return x + (s >= 0 ? gain * Math.exp(-s / 0.004) * Math.sin(2 * Math.PI * 3500 * s) : 0);
      });
    // So much that the kick's own click no longer counts: twice the amplitude is 6.02 dB.
    expect(read(click(0.8)) - read(click(0.4))).toBeCloseTo(6.02, 0);
    expect(read(click(0.4))).toBeGreaterThan(read(kick) + 6);
  });

  it('doesn’t change with gain and polarity', () => {
    expect(read(kick.map((x) => -x / 4))).toBeCloseTo(read(kick), 9);
  });

  it('can’t be told of silence or of a hit that is cut off', () => {
    const options = { sampleRateHz, startAt };
    expect(attackDb(new Float32Array(kick.length), options)).toBeNull();
    expect(attackDb(kick.subarray(0, startAt + 4800), options)).toBeNull();
    expect(() => attackDb(kick, { sampleRateHz: 0, startAt })).toThrow(SignalError);
  });
});
