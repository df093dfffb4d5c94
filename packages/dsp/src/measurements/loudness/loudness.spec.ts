import { createFilterChain, filtered } from '../filters/filterChain';
import { seededNoise } from '../level/testing/seededNoise';
import { kWeighting } from './kWeighting';
import { createLoudness } from './loudness';

function loudness(
  samples: Float32Array,
  { sampleRateHz = 48000, size = 65536 }: { sampleRateHz?: number; size?: number } = {},
): number | null {
  const meter = createLoudness({ sampleRateHz });
  for (let i = 0; i < samples.length; i += size) meter.push(samples.subarray(i, i + size));
  return meter.result().integratedLufs;
}

/** Tones one after the other, levels as peak dBFS. */
function tones(
  parts: readonly (readonly [seconds: number, peakDbfs: number])[],
  { frequencyHz = 1000, sampleRateHz = 48000 } = {},
): Float32Array {
  const ends = parts.map((_, i) => parts.slice(0, i + 1).reduce((sum, [seconds]) => sum + seconds, 0));
  const tone = new Float32Array(Math.round((ends.at(-1) ?? 0) * sampleRateHz));
  parts.forEach(([seconds, peakDbfs], part) => {
    const start = Math.round((ends[part] - seconds) * sampleRateHz);
    const end = Math.round(ends[part] * sampleRateHz);
    for (let i = start; i < end; i += 1)
      tone[i] = 10 ** (peakDbfs / 20) * Math.sin((2 * Math.PI * frequencyHz * i) / sampleRateHz);
  });
  return tone;
}

describe('the integrated loudness', () => {
  it('reads −3.01 for a full-scale sine at 997 Hz, at every rate', () => {
    // BS.1770-5 Annex 1: the anchor; a whole number of periods, so only the filter's start differs.
    for (const sampleRateHz of [44100, 48000, 88200, 96000, 192000]) {
      const tone = tones([[4, 0]], { frequencyHz: 997, sampleRateHz });
      expect(Math.abs((loudness(tone, { sampleRateHz }) ?? NaN) + 3.0103)).toBeLessThan(0.01);
    }
  });

  // EBU Tech 3341 (November 2023), Table 1: stereo in phase, each channel at the level named, −23 or −33 ±0.1. One channel
  // of the two carries half the power: 3.0103 dB less. The last column was computed with SciPy.
  it.each([
    ['1', [[20, -23]], -23, -22.9933],
    ['2', [[20, -33]], -33, -32.9933],
    [
      '3',
      [
        [10, -36],
        [60, -23],
        [10, -36],
      ],
      -23,
      -23.0139,
    ],
    [
      '4',
      [
        [10, -72],
        [10, -36],
        [60, -23],
        [10, -36],
        [10, -72],
      ],
      -23,
      -23.0139,
    ],
    [
      '5',
      [
        [20, -26],
        [20.1, -20],
        [20, -26],
      ],
      -23,
      -22.9787,
    ],
  ] as const)('reads EBU case %s', (_case, parts, expectedLufs, referenceLufs) => {
    const stereo = (loudness(tones(parts)) ?? NaN) + 10 * Math.log10(2);
    expect(Math.abs(stereo - expectedLufs)).toBeLessThan(0.1);
    expect(Math.abs(stereo - referenceLufs)).toBeLessThan(0.001);
  });

  it('does not depend on how the file is cut, nor on polarity', () => {
    const noise = seededNoise({ length: 96000, rms: 0.1, seed: 5 });
    const whole = loudness(noise);
    for (const size of [777, 4096]) expect(loudness(noise, { size })).toBeCloseTo(whole ?? NaN, 9);
    expect(loudness(noise.map((x) => -x))).toBe(whole);
    expect((whole ?? NaN) - (loudness(noise.map((x) => x / 2)) ?? NaN)).toBeCloseTo(6.0206, 4);
  });

  it('leaves silence around the sound out', () => {
    const silence = new Float32Array(10 * 48000);
    const noise = seededNoise({ length: 480000, rms: 0.1, seed: 6 });
    const among = Float32Array.from([...silence, ...noise, ...silence]);
    // Three blocks at either end hold part of the sound; they are few of a hundred, at −3 dB in the mean: 0.13 LU.
    expect(Math.abs((loudness(among) ?? NaN) - (loudness(noise) ?? NaN))).toBeLessThan(0.2);
  });

  it('takes steps to the nearest sample where 100 ms is no whole number of them', () => {
    const tone = tones([[4, -20]], { frequencyHz: 997, sampleRateHz: 11025 });
    // So near to half the rate the bilinear transform bends the head's shelf by a tenth of a decibel.
    expect(Math.abs((loudness(tone, { sampleRateHz: 11025 }) ?? NaN) + 23.0103)).toBeLessThan(0.15);
  });

  it("can't be told for silence, for what is below the gate, or for less than 400 ms", () => {
    expect(loudness(new Float32Array(96000))).toBeNull();
    expect(loudness(tones([[2, -80]]))).toBeNull();
    expect(loudness(tones([[0.399, -20]]))).toBeNull();
    expect(loudness(tones([[0.4, -20]]))).not.toBeNull();
    expect(() => createLoudness({ sampleRateHz: NaN })).toThrow('sampleRateHz must be a finite number');
  });

  it('weighs what a filter chain of its own sections weighs', () => {
    const noise = seededNoise({ length: 19200, rms: 0.1, seed: 7 });
    const weighted = filtered(noise, kWeighting(48000));
    const power = weighted.reduce((sum, x) => sum + x * x, 0) / weighted.length;
    const output = new Float64Array(noise.length);
    createFilterChain(kWeighting(48000)).process(noise, output);
    expect([...output]).toEqual([...weighted]);
    expect(loudness(noise)).toBeCloseTo(10 * Math.log10(power) - 0.691, 9);
  });
});
