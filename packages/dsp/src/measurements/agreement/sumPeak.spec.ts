import { randomNumbers } from '../../testing/randomNumbers';
import { shiftedSamples } from './shiftedSamples';
import { sumPeakDbfs } from './sumPeak';

const sampleRateHz = 48000;
const FRAMES = 4800;

/** A tone that swells and dies around `centre`; smooth, so its value between samples is known. */
const burst = (centre: number, hz = 90): Float32Array =>
  Float32Array.from({ length: FRAMES }, (_, n) => {
    const t = n - centre;
    return 0.5 * Math.exp(-((t / 500) ** 2)) * Math.cos((2 * Math.PI * hz * t) / sampleRateHz);
  });
const largest = (x: Float32Array): number => x.reduce((most, value) => Math.max(most, Math.abs(value)), 0);
const difference = (a: Float32Array, b: Float32Array): number => largest(a.map((x, i) => x - b[i]));
const dbfs = (ratio: number): number => 20 * Math.log10(ratio);

describe('a track played earlier', () => {
  it.each([0.5, 77.7, -33.25, 0.001, 12.999])('by %s samples is where its formula says', (shift) => {
    for (const hz of [90, 1000, 9000]) {
      // Float32 keeps 6e−8; the interpolation's own ripple is a ten-thousandth.
      expect(difference(shiftedSamples(burst(2000 + shift, hz), shift), burst(2000, hz))).toBeLessThan(1e-4);
    }
  });

  it('keeps a tone high up to a thousandth', () => {
    expect(difference(shiftedSamples(burst(2000.5, 20_000), 0.5), burst(2000, 20_000))).toBeLessThan(1e-3);
  });

  it('moves whole samples exactly, and is silent beyond its ends', () => {
    const noise = Float32Array.from({ length: 9 }, randomNumbers(5));
    expect(shiftedSamples(noise, 0)).toEqual(noise);
    expect([...shiftedSamples(noise, 2)]).toEqual([...noise.subarray(2), 0, 0]);
    expect([...shiftedSamples(noise, -20)]).toEqual(Array(9).fill(0));
  });

  it('leaves its input as it was and refuses what is no number', () => {
    const noise = Float32Array.from({ length: 9 }, randomNumbers(5));
    const copy = noise.slice();
    shiftedSamples(noise, 1.5);
    expect(noise).toEqual(copy);
    expect(() => shiftedSamples(noise, NaN)).toThrow('finite');
    expect(() => shiftedSamples(Float32Array.of(NaN), 1)).toThrow('finite');
  });
});

describe('the peak of the two added', () => {
  const peak = (kick: Float32Array, overhead: Float32Array, choice = {}): number | null =>
    sumPeakDbfs(kick, overhead, {
      sampleRateHz,
      choice: { flipped: false, shiftMs: 0, gainDb: 0, ...choice },
    });
  const late = 77.7;
  const shiftMs = (1000 * late) / sampleRateHz;
  const [kick, overhead] = [burst(2000), burst(2000 + late)];

  it.each([
    ['alike', { shiftMs }, 0.5 + 0.5],
    ['half as loud', { shiftMs, gainDb: dbfs(0.5) }, 0.5 + 0.25],
    ['against each other', { shiftMs, gainDb: dbfs(0.4), flipped: true }, 0.5 - 0.2],
    ['twice as loud against each other', { shiftMs, gainDb: dbfs(3), flipped: true }, 1.5 - 0.5],
  ])('%s, is what their formula says', (_how, choice, expected) => {
    // 2e−4 of an amplitude is 0.002 dB.
    expect(Math.abs((peak(kick, overhead, choice) ?? NaN) - dbfs(expected))).toBeLessThan(0.002);
  });

  it('is the louder of two that don’t meet, and above 0 dBFS where they would clip', () => {
    expect(peak(burst(1000), burst(4500))).toBeCloseTo(dbfs(0.5), 6);
    expect(peak(burst(2000), burst(2000), { gainDb: 6.0206 })).toBeCloseTo(dbfs(1.5), 4);
  });

  it('is nothing where the two cancel wholly, or are silent', () => {
    expect(peak(kick, kick, { flipped: true })).toBeNull();
    expect(peak(new Float32Array(10), new Float32Array(10))).toBeNull();
  });

  it('refuses stretches of different lengths', () => {
    expect(() => peak(kick, overhead.subarray(1))).toThrow('same length');
  });
});
