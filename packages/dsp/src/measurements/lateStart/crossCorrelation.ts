import { createComplexTransform } from '../../kernel/complexTransform';
import { createRealTransform, powerOfTwoFrom } from '../spectrum/realSpectrum';

/** Pieces are so many times as long as the lags are far, at least: short enough for a processor's memory, our choice. */
const PIECE_PER_LAG = 2;

/**
 * How alike two signals are when the second is taken to be `lag` steps later, for lags from −`mostLag` to `mostLag`.
 *
 * Piece by piece of the first, against what of the second lies within reach: their spectra add up, so that one transform
 * back is enough.
 *
 * @param a - of the length of `b`
 * @returns −1 … 1 at index `lag + mostLag`, normalised by the energy of both; zeros where one is silent
 */
export function crossCorrelation(a: Float64Array, b: Float64Array, mostLag: number): Float64Array {
  const size = powerOfTwoFrom((PIECE_PER_LAG + 2) * mostLag + 1);
  const transforms = { a: createRealTransform(size), b: createRealTransform(size) };
  const piece = size - 2 * mostLag;
  const reached = new Float64Array(size);
  const back = createComplexTransform(size);
  // Its conjugate: forward from there is backward, as the outcome is real.
  const cross = back.input.fill(0);
  for (let start = 0; start < a.length; start += piece) {
    reached.fill(0);
    reached.set(
      b.subarray(Math.max(0, start - mostLag), start + piece + mostLag),
      Math.max(0, mostLag - start),
    );
    const first = transforms.a.spectrum(a.subarray(start, start + piece));
    const second = transforms.b.spectrum(reached);
    for (let k = 0; k <= size / 2; k += 1) {
      cross[2 * k] += first.re[k] * second.re[k] + first.im[k] * second.im[k];
      cross[2 * k + 1] += first.im[k] * second.re[k] - first.re[k] * second.im[k];
    }
  }
  for (let k = 1; k < size / 2; k += 1) {
    cross[2 * (size - k)] = cross[2 * k];
    cross[2 * (size - k) + 1] = -cross[2 * k + 1];
  }
  const sums = back.transform();
  const scale = Math.sqrt(energy(a) * energy(b));
  return Float64Array.from({ length: 2 * mostLag + 1 }, (_unused, i) =>
    scale > 0 ? sums[2 * i] / size / scale : 0,
  );
}

function energy(samples: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < samples.length; i += 1) sum += samples[i] * samples[i];
  return sum;
}
