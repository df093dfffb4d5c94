import FFT from 'fft.js';
import type { RealSpectrum } from './realSpectrum';

/**
 * The real signal that has this half spectrum, with 1/N scaling.
 *
 * @param spectrum - bins 0 … M of a spectrum of `size` points, M < size/2; what is missing counts as zero, so a larger
 *   `size` interpolates between samples
 * @param size - a power of two
 */
export function inverseReal({ re, im }: RealSpectrum, size: number): Float64Array {
  const fft = new FFT(size);
  const bins = new Float64Array(2 * size);
  for (let i = 0; i < re.length; i += 1) {
    bins[2 * i] = re[i];
    bins[2 * i + 1] = im[i];
    if (i > 0) {
      bins[2 * (size - i)] = re[i];
      bins[2 * (size - i) + 1] = -im[i];
    }
  }
  const output = new Float64Array(2 * size);
  fft.inverseTransform(output, bins);
  return Float64Array.from({ length: size }, (_, i) => output[2 * i]);
}
