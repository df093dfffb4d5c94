import { smallKit } from '../../testing/smallKit';
import { createFlatTops } from './flatTops';
import { seededNoise } from './testing/seededNoise';

const step16 = 2 ** -15;
const step24 = 2 ** -23;

interface Options {
  readonly sampleRateHz?: number;
  readonly quantisationStep?: number | null;
  readonly size?: number;
}

function tops(samples: Float32Array, options: Options = {}) {
  const { sampleRateHz = 48000, quantisationStep = step24, size = samples.length } = options;
  const fullScale = quantisationStep === null ? 0.9999 : 1 - 2 * quantisationStep;
  const meter = createFlatTops({ sampleRateHz, quantisationStep, fullScale });
  for (let i = 0; i < samples.length; i += size) meter.push(samples.subarray(i, i + size));
  return meter.result();
}
const quantised = (samples: Float32Array, step = step24) => samples.map((x) => Math.round(x / step) * step);
const sine = (frequencyHz: number, amplitude: number, { seconds = 0.25, sampleRateHz = 48000 } = {}) =>
  Float32Array.from(
    { length: seconds * sampleRateHz },
    (_, i) => amplitude * Math.sin((2 * Math.PI * frequencyHz * i) / sampleRateHz),
  );
const limited = (samples: Float32Array, most: number) =>
  samples.map((x) => Math.max(-most, Math.min(most, x)));
/** Hits of a small kit, the loudest at `peak`. */
const kit = (seed: number, peak: number, sampleRateHz = 48000) => {
  const { kick } = smallKit({ kicks: 5, hats: true, seed, sampleRateHz });
  const most = kick.reduce((largest, x) => Math.max(largest, Math.abs(x)), 0);
  return kick.map((x) => (x * peak) / most);
};

describe('flat tops below full scale', () => {
  it('are found where the input gave out before the converter', () => {
    for (const seed of [1, 2, 3]) {
      for (const overDb of [1, 3, 6]) {
        const cut = quantised(limited(kit(seed, 10 ** (overDb / 20) * 0.5), 0.5));
        const { flat } = tops(cut);
        expect(flat.runCount).toBeGreaterThanOrEqual(2);
        expect(flat.runs[0].levelDbfs).toBeCloseTo(-6.02, 2);
        const { startSample, lengthSamples } = flat.runs[0];
        expect(new Set(cut.slice(startSample, startSample + lengthSamples)).size).toBe(1);
        expect(lengthSamples).toBeGreaterThanOrEqual(4);
      }
    }
  });

  it('are none in the same hits as they were', () => {
    for (const seed of [1, 2, 3, 4, 5, 6]) {
      for (const step of [step16, step24]) {
        const { flat, looksFlattened } = tops(quantised(kit(seed, 0.5), step), { quantisationStep: step });
        expect([flat.runCount, looksFlattened]).toEqual([0, false]);
      }
    }
  });

  it('are not the round tops of slow waves, which stand still once they are quantised', () => {
    for (const step of [2 ** -7, step16, step24]) {
      for (const frequencyHz of [30, 45, 60, 100, 250, 1000]) {
        for (const amplitude of [0.05, 0.1, 0.5, 0.97]) {
          const wave = quantised(sine(frequencyHz, amplitude), step);
          const { flat, looksFlattened } = tops(wave, { quantisationStep: step });
          expect([flat.runCount, looksFlattened]).toEqual([0, false]);
        }
      }
    }
  });

  it('need four samples at 48 kHz and eight at 96, and two places', () => {
    const top = (length: number) => [0, 0.2, ...Array<number>(length).fill(0.5), 0.1, -0.2];
    const twice = (length: number) => Float32Array.from([...top(length), ...top(length)]);
    expect(tops(twice(3)).flat.runCount).toBe(0);
    expect(tops(twice(4)).flat).toMatchObject({ runCount: 2, clippedSamples: 8 });
    expect(tops(twice(7), { sampleRateHz: 96000 }).flat.runCount).toBe(0);
    expect(tops(twice(8), { sampleRateHz: 96000 }).flat.runCount).toBe(2);
    expect(tops(twice(4), { sampleRateHz: 22050 }).flat.runCount).toBe(2);
    expect(tops(Float32Array.from(top(6))).flat.runCount).toBe(0);
  });

  it('lie within 0.1 dB of the peak, which is at least −30 dBFS and below full scale', () => {
    const top = [0, 0.2, 0.5, 0.5, 0.5, 0.5, 0.1];
    const take = [...top, ...top, ...top];
    expect(tops(Float32Array.from([...take, 0.505, 0])).flat.runCount).toBe(3);
    expect(tops(Float32Array.from([...take, 0.51, 0])).flat.runCount).toBe(0);
    expect(tops(Float32Array.from(take, (x) => x * 0.06)).flat.runCount).toBe(0);
    expect(tops(Float32Array.from(take, (x) => x * 2)).flat.runCount).toBe(0);
  });

  it('do not depend on how the file is cut, nor on polarity', () => {
    const cut = quantised(limited(kit(4, 0.8), 0.5));
    const whole = tops(cut);
    for (const size of [1, 7, 777]) expect(tops(cut, { size })).toEqual(whole);
    expect(tops(cut.map((x) => -x))).toEqual(whole);
  });
});

describe('tops that look flattened', () => {
  it('are seen where noise lies on what was cut before, and never called clipped', () => {
    for (const seed of [1, 2, 3]) {
      const cut = limited(kit(seed, 0.8), 0.5);
      const noise = seededNoise({ length: cut.length, rms: 1e-4, seed });
      const { flat, looksFlattened } = tops(quantised(cut.map((x, i) => x + noise[i])));
      expect([flat.runCount, looksFlattened]).toEqual([0, true]);
    }
  });

  it('are at least three samples long and in three places', () => {
    const top = [0, 0.2, 0.5, 0.4999, 0.5, 0.1];
    const take = (times: number, one = top) => Float32Array.from(Array(times).fill(one).flat() as number[]);
    expect(tops(take(2)).looksFlattened).toBe(false);
    expect(tops(take(3)).looksFlattened).toBe(true);
    expect(tops(take(9, [0, 0.2, 0.5, 0.4999, 0.1])).looksFlattened).toBe(false);
    // Quieter by more than 1 dB than the peak.
    expect(tops(Float32Array.from([...take(9), 0.6, 0])).looksFlattened).toBe(false);
  });

  it('are not seen in noise', () => {
    for (const seed of [1, 2]) {
      const noise = quantised(seededNoise({ length: 240000, rms: 0.2, seed }));
      const burst = noise.map((x, i) => x * Math.exp(-(i % 24000) / 3000));
      expect(tops(burst).looksFlattened).toBe(false);
    }
  });
});
