import type { PairSpectrum } from '../../facts';
import { forBins, lowEnd } from './choiceEnergy';

/**
 * Whether the polarity between the two microphones changed from one take to another, 30–150 Hz.
 *
 * The real part of Σ Sko₁·conj(Sko₂) over √(Σ|Sko₁|²·Σ|Sko₂|²) (docs/measurements.md, 8). How hard the drum was hit and
 * how the preamps stood cancels out.
 *
 * @returns −1 … 1: near −1 flipped between the takes, near 1 as before, near 0 moved too far to say; null where a pair is
 *   silent or the spectra have different bins
 * @example
 * const [skoRe, skoIm] = [spectrum.skoRe, spectrum.skoIm].map((part) => part.map((x) => -x));
 * polarityChanged(spectrum, { ...spectrum, skoRe, skoIm }) // -1
 */
export function polarityChanged(before: PairSpectrum, after: PairSpectrum): number | null {
  if (before.binHz !== after.binHz || before.skk.length !== after.skk.length) return null;
  let [cross, powerBefore, powerAfter] = [0, 0, 0];
  forBins(before, lowEnd, (i, weight) => {
    cross += weight * (before.skoRe[i] * after.skoRe[i] + before.skoIm[i] * after.skoIm[i]);
    powerBefore += weight * (before.skoRe[i] ** 2 + before.skoIm[i] ** 2);
    powerAfter += weight * (after.skoRe[i] ** 2 + after.skoIm[i] ** 2);
  });
  if (!(powerBefore > 0 && powerAfter > 0)) return null;
  return Math.max(-1, Math.min(1, cross / Math.sqrt(powerBefore * powerAfter)));
}

/** How far from 0 the likeness of two pairs must be to say anything; our choice, half way. */
const CLEAR_LIKENESS = 0.5;

/** What a likeness, as {@link polarityChanged} tells it, says. @returns null where it can't be told */
export function seenPolarity(likeness: number | null): 'flipped' | 'as-before' | null {
  if (likeness === null || Math.abs(likeness) < CLEAR_LIKENESS) return null;
  return likeness < 0 ? 'flipped' : 'as-before';
}
