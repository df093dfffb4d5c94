import { createButterworthEnergy } from '../filters/bandEnergy';

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
  /** @returns the values of the hops that this block completed; the array is used again for the next block */
  push(block: Float32Array): Float64Array;
}

export interface Band {
  readonly lowHz: number;
  readonly highHz: number;
}

/** @returns the value of a whole hop; hops are given in order */
type HopValue = (samples: Float32Array, from: number, to: number) => number;

/** Mean square of each hop in a band (Butterworth, second order on either side). */
export function createHopEnergy(sampleRateHz: number, band: Band): HopMeter {
  const energy = createButterworthEnergy({ sampleRateHz, ...band });
  return createHopMeter(hopSamples(sampleRateHz), (samples, from, to) => {
    return energy.next(samples, from, to) / (to - from);
  });
}

/** Largest |x| of each hop. */
export function createHopPeak(sampleRateHz: number): HopMeter {
  return createHopMeter(hopSamples(sampleRateHz), (samples, from, to) => {
    let peak = 0;
    for (let i = from; i < to; i += 1) {
      const size = samples[i] < 0 ? -samples[i] : samples[i];
      if (size > peak) peak = size;
    }
    return peak;
  });
}

/** Hands over whole hops, also where a block ends within one. */
function createHopMeter(size: number, valueOf: HopValue): HopMeter {
  const carried = new Float32Array(size);
  let filled = 0;
  let values = new Float64Array(0);
  return {
    push(block) {
      const count = Math.floor((filled + block.length) / size);
      if (values.length < count) values = new Float64Array(count);
      let done = 0;
      let from = 0;
      if (filled > 0) {
        from = Math.min(block.length, size - filled);
        carried.set(block.subarray(0, from), filled);
        filled += from;
        if (filled < size) return values.subarray(0, 0);
        values[done] = valueOf(carried, 0, size);
        done += 1;
      }
      for (; done < count; done += 1, from += size) values[done] = valueOf(block, from, from + size);
      carried.set(block.subarray(from));
      filled = block.length - from;
      return values.subarray(0, count);
    },
  };
}
