import { createSpanCutter, everySamples, type Spans } from '../measurements/spans';
import { butterworthBand } from '../measurements/filters/butterworth';
import { kWeighting } from '../measurements/loudness/kWeighting';
import { randomNumbers } from '../testing/randomNumbers';
import { createSpanKernel } from './spanKernel';

const sampleRateHz = 48000;
const band = (lowHz: number, highHz: number) => butterworthBand({ sampleRateHz, lowHz, highHz });
const filters = [kWeighting(sampleRateHz), band(30, 150), band(100, 1000), band(5000, 15000)];
const random = randomNumbers(3);
/** Loud, then silent, then quiet, so that filters have something to forget. */
const noise = Float32Array.from({ length: 30_000 }, (_unused, i) =>
  i < 12_000 ? random() : i < 20_000 ? 0 : 1e-4 * random(),
);

/** What both ways say of a signal in blocks, span by span. */
const bothWays = (samples: Float32Array, { count = filters.length, block = 7001, every = 96 } = {}) => {
  const used = filters.slice(0, count);
  const told = (kernel: ReturnType<typeof createSpanKernel>) => {
    const cutter = createSpanCutter([everySamples(every), everySamples(701)], used, kernel);
    const spans: Record<string, number>[] = [];
    for (let start = 0; start < samples.length; start += block)
      spans.push(...figuresOf(cutter.cut(samples.subarray(start, start + block))));
    return spans;
  };
  const kernel = createSpanKernel(used);
  if (!kernel) throw new Error('There is no WebAssembly here.');
  return { kernel: told(kernel), plain: told(null) };
};
const figuresOf = (spans: Spans): Record<string, number>[] =>
  Array.from({ length: spans.count }, (_unused, i) => ({
    end: spans.ends[i],
    low: spans.lows[i],
    high: spans.highs[i],
    sum: spans.sums[i],
    energy: spans.energies[i],
    ...Object.fromEntries(spans.heard.map((energies, band) => [`heard ${band}`, energies[i]])),
  }));
/** Rounding of sums in another order: some 2^-52 of what was added up, of which the signal and its energy are below 1. */
const nearlyTheSame = (one: Record<string, number>[], other: Record<string, number>[]): void => {
  expect(one.length).toBe(other.length);
  const apart = one.map((figures, i) =>
    Math.max(
      ...Object.entries(figures).map(
        ([name, value]) => Math.abs(value - other[i][name]) / Math.max(1, Math.abs(other[i][name])),
      ),
    ),
  );
  expect(Math.max(...apart)).toBeLessThan(1e-12);
};

describe('the kernel of spans', () => {
  it('says what the plain loops say, with an even and an odd number of filters', () => {
    for (const count of [4, 2, 3, 1]) {
      const { kernel, plain } = bothWays(noise, { count });
      nearlyTheSame(kernel, plain);
      expect(kernel.length).toBeGreaterThan(300);
    }
  });

  it('says it of spans of any length, in blocks of any length', () => {
    for (const [block, every] of [
      [30_000, 512],
      [5, 96],
      [9001, 1],
      [1013, 7],
    ]) {
      const { kernel, plain } = bothWays(noise.subarray(0, 15_000), { block, every });
      nearlyTheSame(kernel, plain);
    }
  });

  it('has extremes that are samples, to the last bit', () => {
    const { kernel, plain } = bothWays(noise);
    expect(kernel.map(({ low, high }) => [low, high])).toEqual(plain.map(({ low, high }) => [low, high]));
  });

  it('forgets in silence, and tells a value that is no number', () => {
    const { kernel } = bothWays(new Float32Array(96_000).fill(1, 0, 100));
    expect(kernel.at(-1)).toMatchObject({ 'heard 0': 0, 'heard 2': 0, 'heard 3': 0, energy: 0 });
    const broken = bothWays(Float32Array.of(0.5, NaN, 0.25, 0.5, 0.5)).kernel;
    expect(broken.every(({ energy }) => Number.isFinite(energy))).toBe(false);
  });
});
