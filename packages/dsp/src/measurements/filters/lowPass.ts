import { butterworthLowPass } from './butterworth';
import { filtered } from './filterChain';

interface LowPassOptions {
  readonly sampleRateHz: number;
  readonly cutoffHz: number;
}

/**
 * The low end of a signal without moving it in time: what the pair trace draws.
 *
 * A second-order Butterworth low pass forwards and then backwards, so the phase is zero and the response −6.02 dB at the
 * cutoff, 24 dB per octave above. The first and last period of the cutoff are less exact: read a little more than is
 * drawn.
 *
 * @param samples - mono, any length, finite
 * @returns a new array of the same length
 * @example
 * const steady = lowPass(new Float32Array(9600).fill(1), { sampleRateHz: 48000, cutoffHz: 200 });
 * steady[4800] // 1
 */
export function lowPass(samples: Float32Array, options: LowPassOptions): Float32Array {
  const section = [butterworthLowPass(options)];
  const forwards = filtered(samples, section).reverse();
  return Float32Array.from(filtered(forwards, section).reverse());
}
