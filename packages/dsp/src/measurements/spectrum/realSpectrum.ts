import FFT from 'fft.js';

/** Bins 0 … N/2 of a real signal's spectrum. */
export interface RealSpectrum {
  readonly re: Float64Array;
  readonly im: Float64Array;
}

export interface RealTransform {
  readonly size: number;
  /**
   * @returns the spectrum of `samples`, followed by zeros up to `size`; unscaled (a unit impulse has 1 everywhere).
   *   Valid until the next call: one transform for each spectrum that is needed at the same time
   */
  spectrum(samples: Float64Array): RealSpectrum;
}

/**
 * A forward transform of fixed size that reuses its tables, its buffers and its result.
 *
 * @param size - a power of two
 */
export function createRealTransform(size: number): RealTransform {
  const fft = new FFT(size);
  const input = new Float64Array(size);
  const output = new Float64Array(2 * size);
  const re = new Float64Array(size / 2 + 1);
  const im = new Float64Array(size / 2 + 1);
  return {
    size,
    spectrum(samples) {
      input.fill(0);
      input.set(samples.length > size ? samples.subarray(0, size) : samples);
      fft.realTransform(output, input);
      for (let i = 0; i < re.length; i += 1) {
        re[i] = output[2 * i];
        im[i] = output[2 * i + 1];
      }
      return { re, im };
    },
  };
}

/** @returns the smallest power of two that is at least `length` */
export function powerOfTwoFrom(length: number): number {
  return 2 ** Math.ceil(Math.log2(Math.max(2, length)));
}
