import { createRealTransform, powerOfTwoFrom, type RealSpectrum } from './realSpectrum';

/** Long enough for the bins that are asked for, short enough for a processor's memory; our choice, for speed. */
const shortestPart = 4096;

/**
 * The lowest bins of a long signal's spectrum, by transforms of every n-th sample (decimation in time: Cooley & Tukey 1965),
 * which need no tables of the signal's length.
 *
 * @param samples - followed by zeros up to `size`
 * @param options.size - a power of two
 * @param options.binCount - at most half of `size`
 * @returns bins 0 … binCount − 1, unscaled, as of a transform of `size` points
 */
export function lowSpectrum(
  samples: Float64Array,
  { size, binCount }: { readonly size: number; readonly binCount: number },
): RealSpectrum {
  const partSize = Math.min(size, Math.max(shortestPart, powerOfTwoFrom(2 * binCount)));
  const parts = size / partSize;
  const transform = createRealTransform(partSize);
  const part = new Float64Array(partSize);
  const re = new Float64Array(binCount);
  const im = new Float64Array(binCount);
  for (let first = 0; first < parts; first += 1) {
    for (let i = 0, at = first; i < partSize; i += 1, at += parts)
      part[i] = at < samples.length ? samples[at] : 0;
    const spectrum = transform.spectrum(part, binCount);
    const turn = (-2 * Math.PI * first) / size;
    for (let k = 0; k < binCount; k += 1) {
      const [cosine, sine] = [Math.cos(turn * k), Math.sin(turn * k)];
      re[k] += spectrum.re[k] * cosine - spectrum.im[k] * sine;
      im[k] += spectrum.re[k] * sine + spectrum.im[k] * cosine;
    }
  }
  return { re, im };
}
