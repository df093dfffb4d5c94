import FFT from 'fft.js';
import type { RealSpectrum } from './realSpectrum';

/**
 * A backward transform of fixed size, 1/N scaled, that reuses its tables.
 *
 * @param size - a power of two
 * @returns a function from bins 0 … M, M < size/2, to the real signal that has them; what is missing counts as zero, so a
 *   larger `size` interpolates between samples. Results are new arrays.
 */
export function createInverseReal(size: number): (spectrum: RealSpectrum) => Float64Array {
  const fft = new FFT(size);
  const bins = new Float64Array(2 * size);
  const output = new Float64Array(2 * size);
  return ({ re, im }) => {
    bins.fill(0);
    bins[0] = re[0];
    // Twice the lower half instead of both halves: the real part of the result is the same.
    for (let i = 1; i < re.length; i += 1) {
      bins[2 * i] = 2 * re[i];
      bins[2 * i + 1] = 2 * im[i];
    }
    fft.inverseTransform(output, bins);
    const samples = new Float64Array(size);
    for (let i = 0; i < size; i += 1) samples[i] = output[2 * i];
    return samples;
  };
}
