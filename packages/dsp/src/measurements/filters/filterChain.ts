import type { Biquad } from './butterworth';

/** Sections one after the other; remembers its state from block to block. */
export interface FilterChain {
  /** Filters `input` into `output` (same length; may be the same array) and carries the state on. */
  process(input: Float32Array | Float64Array, output: Float64Array): void;
}

/** Below any sample a 64-bit float file can mean; stops a decaying state from becoming slow denormal numbers. */
const SMALLEST_STATE = 1e-30;

/**
 * Runs biquad sections over a signal that comes in blocks; the result doesn't depend on how it is cut.
 *
 * @param sections - at least one, applied in order, starting from silence
 */
export function createFilterChain(sections: readonly Biquad[]): FilterChain {
  const states = sections.map(() => new Float64Array(2));
  return {
    process(input, output) {
      sections.forEach((section, index) => {
        runSection(section, states[index], { input: index === 0 ? input : output, output });
      });
    },
  };
}

/**
 * Filters a whole signal from silence.
 *
 * @returns a new array of the same length; the input is left alone
 */
export function filtered(samples: Float32Array | Float64Array, sections: readonly Biquad[]): Float64Array {
  const output = new Float64Array(samples.length);
  createFilterChain(sections).process(samples, output);
  return output;
}

/** Transposed direct form II: least rounding noise at low cutoffs. */
function runSection(
  { b0, b1, b2, a1, a2 }: Biquad,
  state: Float64Array,
  { input, output }: { input: Float32Array | Float64Array; output: Float64Array },
): void {
  let z1 = state[0];
  let z2 = state[1];
  for (let i = 0; i < input.length; i += 1) {
    const x = input[i];
    const y = b0 * x + z1;
    z1 = b1 * x - a1 * y + z2;
    z2 = b2 * x - a2 * y;
    output[i] = y;
  }
  state[0] = Math.abs(z1) < SMALLEST_STATE ? 0 : z1;
  state[1] = Math.abs(z2) < SMALLEST_STATE ? 0 : z2;
}
