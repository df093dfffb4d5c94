import { createComplexTransform } from '../../kernel/complexTransform';

/** Bins 0 … N/2 of a real signal's spectrum. */
export interface RealSpectrum {
  readonly re: Float64Array;
  readonly im: Float64Array;
}

export interface RealTransform {
  readonly size: number;
  /**
   * @param binCount - how many bins are wanted; all of them unless told
   * @returns the spectrum of `samples`, followed by zeros up to `size`; unscaled (a unit impulse has 1 everywhere).
   *   Valid until the next call: one transform for each spectrum that is needed at the same time
   */
  spectrum(samples: Float32Array | Float64Array, binCount?: number): RealSpectrum;
}

/**
 * A forward transform of fixed size that reuses its tables, its buffers and its result.
 *
 * @param size - a power of two
 */
export function createRealTransform(size: number): RealTransform {
  // Even samples as real parts, odd ones as imaginary parts: a transform of half the size, taken apart afterwards.
  const half = size / 2;
  const complex = createComplexTransform(half);
  const { cosines, sines } = halfTurn(size);
  const re = new Float64Array(half + 1);
  const im = new Float64Array(half + 1);
  return {
    size,
    spectrum(samples, binCount = half + 1) {
      const length = Math.min(size, samples.length);
      complex.input.set(length < samples.length ? samples.subarray(0, length) : samples);
      complex.input.fill(0, length);
      const output = complex.transform();
      // Bins 0 and N/2 stand in the first point together.
      re[0] = output[0] + output[1];
      re[half] = output[0] - output[1];
      im[0] = 0;
      im[half] = 0;
      const last = Math.min(binCount, half);
      for (let k = 1; k < last; k += 1) {
        const at = 2 * k;
        const mirrored = 2 * (half - k);
        const evenRe = (output[at] + output[mirrored]) / 2;
        const evenIm = (output[at + 1] - output[mirrored + 1]) / 2;
        const oddRe = (output[at + 1] + output[mirrored + 1]) / 2;
        const oddIm = (output[mirrored] - output[at]) / 2;
        re[k] = evenRe + cosines[k] * oddRe + sines[k] * oddIm;
        im[k] = evenIm + cosines[k] * oddIm - sines[k] * oddRe;
      }
      return { re, im };
    },
  };
}

interface Turns {
  readonly cosines: Float64Array;
  readonly sines: Float64Array;
}

/** They depend on nothing but the size, and take as long to make as some transforms. */
const kept = new Map<number, Turns>();
const largestKept = 2 ** 15;

/** @returns cos and sin of 2πk/size, k = 0 … size/2 */
export function halfTurn(size: number): Turns {
  const known = kept.get(size);
  if (known) return known;
  const turn = (2 * Math.PI) / size;
  const cosines = new Float64Array(size / 2 + 1);
  const sines = new Float64Array(size / 2 + 1);
  for (let k = 0; k <= size / 2; k += 1) {
    cosines[k] = Math.cos(turn * k);
    sines[k] = Math.sin(turn * k);
  }
  if (size <= largestKept) kept.set(size, { cosines, sines });
  return { cosines, sines };
}

/** @returns the smallest power of two that is at least `length` */
export function powerOfTwoFrom(length: number): number {
  return 2 ** Math.ceil(Math.log2(Math.max(2, length)));
}
