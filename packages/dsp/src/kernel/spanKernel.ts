import type { Biquad } from '../measurements/filters/butterworth';
import { bandEnergyCoefficients } from '../measurements/filters/bandEnergy';
import { spanKernelText } from './spanKernelText';
import { compiledKernel, kernelInstance } from './webAssembly';

export type BandFilter = readonly [Biquad, Biquad];

export interface SpanFigures {
  readonly lows: Float64Array;
  readonly highs: Float64Array;
  readonly sums: Float64Array;
  readonly energies: Float64Array;
  /** Sum of squares of what each of the filters lets through, filter by filter. */
  readonly heard: readonly Float64Array[];
}

export interface SpanKernel {
  /**
   * Figures of the spans `first` to `last` (not included) of a block, which come in order.
   *
   * @param ends - where each span of the block ends in it; the first of them begins where the one before ends
   */
  measure(
    block: Float32Array,
    ends: Int32Array,
    range: { first: number; last: number; into: SpanFigures },
  ): void;
}

/** What is worked on at once stays in a processor's nearest memory. */
const mostSamples = 8_192;
/** Of one sample at least. */
const mostSpans = 1_024;
const places = {
  samples: 0,
  ends: 4 * mostSamples,
  extremes: 4 * mostSamples + 4 * mostSpans,
  bands: 4 * mostSamples + 36 * mostSpans,
  filters: 4 * mostSamples + 52 * mostSpans,
};
/** Eight coefficients and four states, two numbers each. */
const filterBytes = 12 * 16;
const filtersAtOnce = 2;

let compiled: object | null | undefined;

/**
 * The figures of spans by a kernel that takes two and four numbers at a time; the same as the plain loops of `spans.ts` but
 * for rounding.
 *
 * @param filters - each of two sections one after the other
 * @returns null where there is none to be had: then the plain loops do the same
 */
export function createSpanKernel(filters: readonly BandFilter[]): SpanKernel | null {
  compiled = compiled === undefined ? compiledKernel(spanKernelText) : compiled;
  if (!compiled) return null;
  const pairs = Math.ceil(filters.length / filtersAtOnce);
  const instance = kernelInstance(compiled, places.filters + pairs * filterBytes);
  if (!instance) return null;
  const { functions, memory } = instance;
  const samples = new Float32Array(memory, places.samples, mostSamples);
  const spanEnds = new Int32Array(memory, places.ends, mostSpans);
  const extremes = new Float64Array(memory, places.extremes, 4 * mostSpans);
  const bands = new Float64Array(memory, places.bands, filtersAtOnce * mostSpans);
  const gains = filters.map(([first, second]) => (first.b0 * second.b0) ** 2);
  filters.forEach((filter, index) => {
    const lane = index % filtersAtOnce;
    const at = places.filters + Math.floor(index / filtersAtOnce) * filterBytes;
    const coefficients = new Float64Array(memory, at, filterBytes / 8);
    bandEnergyCoefficients(filter).forEach((value, i) => {
      coefficients[filtersAtOnce * i + lane] = value;
    });
  });
  const some = (from: number, count: number, into: SpanFigures): void => {
    functions['extremes'](places.samples, places.ends, count, places.extremes);
    for (let i = 0; i < count; i += 1) {
      into.lows[from + i] = extremes[4 * i];
      into.highs[from + i] = extremes[4 * i + 1];
      into.sums[from + i] = extremes[4 * i + 2];
      into.energies[from + i] = extremes[4 * i + 3];
    }
    for (let pair = 0; pair < pairs; pair += 1) {
      const filter = places.filters + pair * filterBytes;
      functions['band_energies'](places.samples, places.ends, count, filter, places.bands);
      for (let lane = 0; lane < filtersAtOnce && filtersAtOnce * pair + lane < filters.length; lane += 1) {
        const index = filtersAtOnce * pair + lane;
        const energies = into.heard[index];
        for (let i = 0; i < count; i += 1)
          energies[from + i] = gains[index] * bands[filtersAtOnce * i + lane];
      }
    }
  };
  return {
    measure(block, ends, { first, last, into }) {
      for (let span = first; span < last;) {
        const start = span === 0 ? 0 : ends[span - 1];
        let count = 0;
        while (span + count < last && count < mostSpans && ends[span + count] - start <= mostSamples) {
          spanEnds[count] = ends[span + count] - start;
          count += 1;
        }
        samples.set(block.subarray(start, ends[span + count - 1]));
        some(span, count, into);
        span += count;
      }
    },
  };
}
