import { butterworthBand, type Biquad } from './butterworth';

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
 * With b0 taken out as a gain and u the state before a sample, y = x + u1, u1' = (b1/b0 − a1)·x − a1·u1 + u2,
 * u2' = (b2/b0 − a2)·x − a2·u1: the transposed direct form II of filterChain with y put in, equal to it but for rounding.
 *
 * @param sections - with a first coefficient that isn't 0
 */
export function createBandEnergy([first, second]: readonly [Biquad, Biquad]): BandEnergy {
  const coefficients = Float64Array.from(bandEnergyCoefficients([first, second]));
  const gain = (first.b0 * second.b0) ** 2;
  const state = new Float64Array(4);
  return {
    next(samples, from, to) {
      // Locals from typed arrays: what a closure keeps would be loaded and checked again for every sample.
      const [p1, p2, pa1, pa2] = [coefficients[0], coefficients[1], coefficients[2], coefficients[3]];
      const [q1, q2, qa1, qa2] = [coefficients[4], coefficients[5], coefficients[6], coefficients[7]];
      let [u1, u2, v1, v2] = [state[0], state[1], state[2], state[3]];
      let energy = 0;
      for (let i = from; i < to; i += 1) {
        const x = samples[i];
        const y = x + u1;
        const nextU1 = p1 * x + u2 - pa1 * u1;
        u2 = p2 * x - pa2 * u1;
        u1 = nextU1;
        const z = y + v1;
        const nextV1 = q1 * y + v2 - qa1 * v1;
        v2 = q2 * y - qa2 * v1;
        v1 = nextV1;
        energy += z * z;
      }
      state[0] = settled(u1);
      state[1] = settled(u2);
      state[2] = settled(v1);
      state[3] = settled(v2);
      return gain * energy;
    },
  };
}

/**
 * The same for a high pass and a low pass one after the other (Butterworth, second order each), which cost less: their
 * numerators (1 − z⁻¹)²·(1 + z⁻¹)² are (1 − z⁻²)² together, two subtractions, and what is left are two pairs of poles.
 */
export function createButterworthEnergy(band: {
  readonly sampleRateHz: number;
  readonly lowHz: number;
  readonly highHz: number;
}): BandEnergy {
  const [highPass, lowPass] = butterworthBand(band);
  const poles = Float64Array.of(highPass.a1, highPass.a2, lowPass.a1, lowPass.a2);
  const gain = (highPass.b0 * lowPass.b0) ** 2;
  // The last two inputs, their last two differences, and the last two outputs of each pair of poles.
  const state = new Float64Array(8);
  return {
    next(samples, from, to) {
      const [a1, a2, c1, c2] = [poles[0], poles[1], poles[2], poles[3]];
      let [x1, x2, d1, d2] = [state[0], state[1], state[2], state[3]];
      let [y1, y2, z1, z2] = [state[4], state[5], state[6], state[7]];
      let energy = 0;
      for (let i = from; i < to; i += 1) {
        const x = samples[i];
        const d = x - x2;
        const y = d - d2 - a2 * y2 - a1 * y1;
        const z = y - c2 * z2 - c1 * z1;
        x2 = x1;
        x1 = x;
        d2 = d1;
        d1 = d;
        y2 = y1;
        y1 = y;
        z2 = z1;
        z1 = z;
        energy += z * z;
      }
      state[0] = x1;
      state[1] = x2;
      state[2] = d1;
      state[3] = d2;
      state[4] = settled(y1);
      state[5] = settled(y2);
      state[6] = settled(z1);
      state[7] = settled(z2);
      return gain * energy;
    },
  };
}

/** @returns for each of the two sections b1/b0 − a1, b2/b0 − a2, a1 and a2 */
export function bandEnergyCoefficients([first, second]: readonly [Biquad, Biquad]): readonly number[] {
  return [...stateForm(first), ...stateForm(second)];
}

function stateForm({ b0, b1, b2, a1, a2 }: Biquad): readonly [number, number, number, number] {
  return [b1 / b0 - a1, b2 / b0 - a2, a1, a2];
}

function settled(state: number): number {
  return Math.abs(state) < SMALLEST_STATE ? 0 : state;
}
