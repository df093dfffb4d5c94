import type { Biquad } from './butterworth';

/** Two sections one after the other whose output is only wanted for its energy; remembers their state. */
export interface BandEnergy {
  /** @returns the sum of squares of the filtered samples `from` to `to` (exclusive) of a signal that is given in order */
  next(samples: Float32Array | Float64Array, from: number, to: number): number;
}

/** As in filterChain: stops a decaying state from becoming slow denormal numbers. */
const SMALLEST_STATE = 1e-30;

/**
 * The fast variant of a filter chain of two sections whose output is squared and added up: nothing is stored, and each
 * section's state depends on nothing but its own state and input, so that a processor overlaps both.
 *
 * With u the state before a sample, y = b0·x + u1, u1' = (b1 − a1·b0)·x − a1·u1 + u2, u2' = (b2 − a2·b0)·x − a2·u1: the
 * transposed direct form II of filterChain with y put in, equal to it but for rounding.
 */
export function createBandEnergy([first, second]: readonly [Biquad, Biquad]): BandEnergy {
  const state = new Float64Array(4);
  const [p0, p1, p2, pa1, pa2] = stateForm(first);
  const [q0, q1, q2, qa1, qa2] = stateForm(second);
  return {
    next(samples, from, to) {
      let [u1, u2, v1, v2] = [state[0], state[1], state[2], state[3]];
      let energy = 0;
      for (let i = from; i < to; i += 1) {
        const x = samples[i];
        const y = p0 * x + u1;
        const nextU1 = p1 * x + u2 - pa1 * u1;
        u2 = p2 * x - pa2 * u1;
        u1 = nextU1;
        const z = q0 * y + v1;
        const nextV1 = q1 * y + v2 - qa1 * v1;
        v2 = q2 * y - qa2 * v1;
        v1 = nextV1;
        energy += z * z;
      }
      state[0] = settled(u1);
      state[1] = settled(u2);
      state[2] = settled(v1);
      state[3] = settled(v2);
      return energy;
    },
  };
}

function stateForm({ b0, b1, b2, a1, a2 }: Biquad): readonly [number, number, number, number, number] {
  return [b0, b1 - a1 * b0, b2 - a2 * b0, a1, a2];
}

function settled(state: number): number {
  return Math.abs(state) < SMALLEST_STATE ? 0 : state;
}
