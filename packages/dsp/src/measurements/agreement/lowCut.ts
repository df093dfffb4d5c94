import type { PairSpectrum } from '../../facts';

/** The low cut found on most preamps and mixers: 80 Hz, 12 dB per octave (measurements.md, 5; common practice, no source). */
const CUTOFF_HZ = 80;

/** Complex response at f. */
export interface Response {
  readonly re: number;
  readonly im: number;
}

/**
 * A second-order Butterworth high pass, H = s²/(s² + √2·s + 1) with s = j·f/80 Hz.
 *
 * @param frequencyHz - >= 0
 */
export function lowCutResponse(frequencyHz: number): Response {
  const x = frequencyHz / CUTOFF_HZ;
  const numerator = -x * x;
  const re = 1 - x * x;
  const im = Math.SQRT2 * x;
  const size = re * re + im * im;
  return { re: (numerator * re) / size, im: (-numerator * im) / size };
}

/** The pair as it would be with a low cut on the overhead: Soo·|H|² and Sko·conj(H). */
export function withLowCut(spectrum: PairSpectrum): PairSpectrum {
  const soo = spectrum.soo.slice();
  const skoRe = spectrum.skoRe.slice();
  const skoIm = spectrum.skoIm.slice();
  for (let i = 0; i < soo.length; i += 1) {
    const { re, im } = lowCutResponse(i * spectrum.binHz);
    soo[i] *= re * re + im * im;
    skoRe[i] = spectrum.skoRe[i] * re + spectrum.skoIm[i] * im;
    skoIm[i] = spectrum.skoIm[i] * re - spectrum.skoRe[i] * im;
  }
  return { ...spectrum, soo, skoRe, skoIm };
}
