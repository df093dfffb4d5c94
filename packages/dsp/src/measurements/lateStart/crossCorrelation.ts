import FFT from 'fft.js';
import { powerOfTwoFrom } from '../spectrum/realSpectrum';

/**
 * How alike two signals are when the second is taken to be `lag` steps later, for lags from −`mostLag` to `mostLag`.
 *
 * @param a - of the length of `b`
 * @returns −1 … 1 at index `lag + mostLag`, normalised by the energy of both; zeros where one is silent
 */
export function crossCorrelation(a: Float64Array, b: Float64Array, mostLag: number): Float64Array {
  const size = powerOfTwoFrom(a.length + mostLag + 1);
  const fft = new FFT(size);
  const spectrum = (samples: Float64Array): Float64Array => {
    const input = new Float64Array(size);
    input.set(samples);
    const output = new Float64Array(2 * size);
    fft.realTransform(output, input);
    fft.completeSpectrum(output);
    return output;
  };
  const [first, second] = [spectrum(a), spectrum(b)];
  const cross = new Float64Array(2 * size);
  for (let i = 0; i < cross.length; i += 2) {
    cross[i] = first[i] * second[i] + first[i + 1] * second[i + 1];
    cross[i + 1] = first[i] * second[i + 1] - first[i + 1] * second[i];
  }
  const sums = new Float64Array(2 * size);
  fft.inverseTransform(sums, cross);
  const scale = Math.sqrt(energy(a) * energy(b));
  return Float64Array.from({ length: 2 * mostLag + 1 }, (_unused, i) =>
    scale > 0 ? sums[2 * ((i - mostLag + size) % size)] / scale : 0,
  );
}

function energy(samples: Float64Array): number {
  return samples.reduce((sum, sample) => sum + sample * sample, 0);
}
