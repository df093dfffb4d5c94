import { createComplexTransform } from '../../kernel/complexTransform';
import { halfTurn, type RealSpectrum } from './realSpectrum';

/**
 * A backward transform of fixed size, 1/N scaled, that reuses its tables.
 *
 * @param size - a power of two
 * @returns a function from bins 0 … M, M < size/2, to the real signal that has them; what is missing counts as zero, so a
 *   larger `size` interpolates between samples. A result is good until the next call.
 */
export function createInverseReal(size: number): (spectrum: RealSpectrum) => Float64Array {
  // The way of createRealTransform backwards: half the size, even samples as real parts, odd ones as imaginary parts.
  const half = size / 2;
  // Forward, with real and imaginary parts changed over on both sides, is backward.
  const complex = createComplexTransform(half);
  const { cosines, sines } = halfTurn(size);
  const samples = new Float64Array(size);
  return ({ re, im }) => {
    const bins = complex.input;
    bins.fill(0);
    const count = Math.min(re.length, half);
    if (count > 0) [bins[0], bins[1]] = [re[0], re[0]];
    for (let k = 1; k < count; k += 1) {
      // Even and odd samples' spectra share a bin and its mirror; here the mirror itself is 0 or adds to what is there.
      const turnedRe = re[k] * cosines[k] - im[k] * sines[k];
      const turnedIm = re[k] * sines[k] + im[k] * cosines[k];
      bins[2 * k + 1] += re[k] - turnedIm;
      bins[2 * k] += im[k] + turnedRe;
      const mirrored = 2 * (half - k);
      bins[mirrored + 1] += re[k] + turnedIm;
      bins[mirrored] += turnedRe - im[k];
    }
    const output = complex.transform();
    // Both halves of the spectrum were added up, over half as many points.
    for (let i = 0; i < size; i += 2) {
      samples[i] = output[i + 1] / size;
      samples[i + 1] = output[i] / size;
    }
    return samples;
  };
}
