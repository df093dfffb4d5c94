import { crossfade, crossfadeS } from './crossfade';

const sampleRateHz = 48_000;
const frames = Math.round(crossfadeS * sampleRateHz);

/** A repeatable noise, −1 … 1. */
function noise(seed: number): () => number {
  let state = seed;
  return () => {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) | 0;
    return state / 2 ** 31;
  };
}

/** Two seconds of something like drums: kicks with a click every half second over a bed of noise. */
function drums(seed: number, kickHz: number): Float32Array {
  const random = noise(seed);
  const period = sampleRateHz / 2;
  return Float32Array.from({ length: 2 * sampleRateHz }, (_, i) => {
    const since = (i % period) / sampleRateHz;
    const kick = Math.exp(-since * 9) * Math.sin(2 * Math.PI * kickHz * since);
    const click = Math.exp(-since * 400) * random();
    return 0.7 * kick + 0.2 * click + 0.003 * random();
  });
}

const largest = (samples: Float32Array) => samples.reduce((top, value) => Math.max(top, Math.abs(value)), 0);

function largestStep(samples: Float32Array, from = 1, to = samples.length): number {
  let largest = 0;
  for (let i = Math.max(1, from); i < to; i++)
    largest = Math.max(largest, Math.abs(samples[i] - samples[i - 1]));
  return largest;
}

describe('the switch between two takes', () => {
  const before = drums(1, 58);
  const after = drums(2, 63);
  const own = Math.max(largestStep(before), largestStep(after));

  it('steps nowhere further than the two takes do by themselves', () => {
    for (let at = 1; at < before.length - frames; at += 331) {
      const around = (samples: Float32Array) => samples.subarray(at - 1, at + frames + 1);
      const heard = crossfade(around(before), around(after), { at: 1, frames });
      expect(largestStep(heard)).toBeLessThanOrEqual(own);
    }
  });

  it('would step further without the fade', () => {
    const kickPeak = sampleRateHz / 2 + Math.round(sampleRateHz / 63 / 4);
    const cut = crossfade(
      before,
      after.map((value) => -value),
      { at: kickPeak, frames: 1 },
    );
    expect(largestStep(cut, kickPeak - 2, kickPeak + 4)).toBeGreaterThan(own);
    const faded = crossfade(
      before,
      after.map((value) => -value),
      { at: kickPeak, frames },
    );
    expect(largestStep(faded, kickPeak, kickPeak + frames + 1)).toBeLessThanOrEqual(own);
  });

  it('is not to be heard at all from a take to itself', () => {
    const heard = crossfade(before, before, { at: 20_000, frames });
    expect(largest(heard.map((value, i) => value - before[i]))).toBeLessThan(1e-6);
  });

  it('is never louder than the louder of the two', () => {
    const full = new Float32Array(2000).fill(1);
    const heard = crossfade(
      full,
      full.map((value) => -value),
      { at: 500, frames },
    );
    expect(largest(heard)).toBeLessThanOrEqual(1);
  });

  it('leaves everything before and after it untouched', () => {
    const heard = crossfade(before, after, { at: 20_000, frames });
    expect(heard.subarray(0, 20_000)).toEqual(before.subarray(0, 20_000));
    expect(heard.subarray(20_000 + frames)).toEqual(after.subarray(20_000 + frames));
  });
});
