import type { Biquad } from '../filters/butterworth';
import { createFilterChain } from '../filters/filterChain';

/**
 * Length of one hop. Shorter than any rise of a drum hit that matters here, and short enough for its own rises to be
 * placed; our choice.
 */
export const HOP_MS = 2;

/** @returns the number of samples in one hop, at least 1 */
export function hopSamples(sampleRateHz: number): number {
  return Math.max(1, Math.round((sampleRateHz * HOP_MS) / 1000));
}

/** One value for every hop of 2 ms. */
export interface HopMeter {
  /** @returns the values of the hops that this block completed */
  push(block: Float32Array): Float64Array;
}

type Samples = Float32Array | Float64Array;

interface Stretch {
  readonly from: number;
  readonly to: number;
}

interface Fold {
  /** Takes a stretch of samples into the value so far, which starts at 0. */
  take(soFar: number, samples: Samples, stretch: Stretch): number;
  end(value: number, samples: number): number;
}

const meanSquareFold: Fold = {
  take(soFar, samples, { from, to }) {
    let sum = soFar;
    for (let i = from; i < to; i += 1) sum += samples[i] * samples[i];
    return sum;
  },
  end: (value, samples) => value / samples,
};
const peakFold: Fold = {
  take(soFar, samples, { from, to }) {
    let peak = soFar;
    for (let i = from; i < to; i += 1) {
      const size = samples[i] < 0 ? -samples[i] : samples[i];
      if (size > peak) peak = size;
    }
    return peak;
  },
  end: (value) => value,
};

/** Mean square of each hop after filtering; `sections` as in {@link createFilterChain}. */
export function createHopEnergy(sampleRateHz: number, sections: readonly Biquad[]): HopMeter {
  return createHopFold(sampleRateHz, { fold: meanSquareFold, sections });
}

/** Largest |x| of each hop. */
export function createHopPeak(sampleRateHz: number): HopMeter {
  return createHopFold(sampleRateHz, { fold: peakFold, sections: [] });
}

function createHopFold(
  sampleRateHz: number,
  { fold, sections }: { fold: Fold; sections: readonly Biquad[] },
): HopMeter {
  const size = hopSamples(sampleRateHz);
  const chain = sections.length > 0 ? createFilterChain(sections) : null;
  let scratch = new Float64Array(0);
  let value = 0;
  let filled = 0;
  const prepared = (block: Float32Array): Samples => {
    if (!chain) return block;
    if (scratch.length < block.length) scratch = new Float64Array(block.length);
    const output = scratch.subarray(0, block.length);
    chain.process(block, output);
    return output;
  };
  return {
    push(block) {
      const samples = prepared(block);
      const values = new Float64Array(Math.floor((filled + samples.length) / size));
      let count = 0;
      for (let from = 0; from < samples.length;) {
        const to = Math.min(samples.length, from + size - filled);
        value = fold.take(value, samples, { from, to });
        filled += to - from;
        from = to;
        if (filled === size) {
          values[count] = fold.end(value, size);
          count += 1;
          value = 0;
          filled = 0;
        }
      }
      return values;
    },
  };
}
