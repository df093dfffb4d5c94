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
      // Two at a time: a processor works on the second while it waits for the first.
      for (let index = 0; index < sections.length; index += 2) {
        const from = index === 0 ? input : output;
        if (index + 1 === sections.length)
          runSection(sections[index], states[index], { input: from, output });
        else
          runTwoSections([sections[index], sections[index + 1]], [states[index], states[index + 1]], {
            input: from,
            output,
          });
      }
    },
  };
}

/**
 * Filters a whole signal from silence.
 *
 * @param into - room that is filled instead of new memory where it is long enough
 * @returns as many samples; the input is left alone
 */
export function filtered(
  samples: Float32Array | Float64Array,
  sections: readonly Biquad[],
  into?: Float64Array,
): Float64Array {
  const output =
    into && into.length >= samples.length
      ? into.subarray(0, samples.length)
      : new Float64Array(samples.length);
  createFilterChain(sections).process(samples, output);
  return output;
}

interface Signals {
  readonly input: Float32Array | Float64Array;
  readonly output: Float64Array;
}

/** {@link runSection} twice in one loop, sample by sample the same. */
function runTwoSections(
  [first, second]: readonly [Biquad, Biquad],
  [stateOfFirst, stateOfSecond]: readonly [Float64Array, Float64Array],
  { input, output }: Signals,
): void {
  const { b0, b1, b2, a1, a2 } = first;
  const { b0: c0, b1: c1, b2: c2, a1: d1, a2: d2 } = second;
  let [y1, y2] = [stateOfFirst[0], stateOfFirst[1]];
  let [z1, z2] = [stateOfSecond[0], stateOfSecond[1]];
  for (let i = 0; i < input.length; i += 1) {
    const x = input[i];
    const y = b0 * x + y1;
    y1 = b1 * x - a1 * y + y2;
    y2 = b2 * x - a2 * y;
    const z = c0 * y + z1;
    z1 = c1 * y - d1 * z + z2;
    z2 = c2 * y - d2 * z;
    output[i] = z;
  }
  keep(stateOfFirst, y1, y2);
  keep(stateOfSecond, z1, z2);
}

/** Transposed direct form II: least rounding noise at low cutoffs. */
function runSection({ b0, b1, b2, a1, a2 }: Biquad, state: Float64Array, { input, output }: Signals): void {
  let z1 = state[0];
  let z2 = state[1];
  for (let i = 0; i < input.length; i += 1) {
    const x = input[i];
    const y = b0 * x + z1;
    z1 = b1 * x - a1 * y + z2;
    z2 = b2 * x - a2 * y;
    output[i] = y;
  }
  keep(state, z1, z2);
}

function keep(state: Float64Array, first: number, second: number): void {
  state[0] = Math.abs(first) < SMALLEST_STATE ? 0 : first;
  state[1] = Math.abs(second) < SMALLEST_STATE ? 0 : second;
}
