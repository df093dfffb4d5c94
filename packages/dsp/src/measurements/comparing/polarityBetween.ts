import type { PairSpectrum, TakeFacts } from '../../facts';
import { polarityChanged, seenPolarity } from '../agreement/polarityChanged';
import { lowEndSign, takeSide } from './takeSide';

export interface PolarityBetweenInput {
  readonly before: TakeFacts;
  readonly after: TakeFacts;
  /** Of the first pair of each. */
  readonly spectra: { readonly before: PairSpectrum | null; readonly after: PairSpectrum | null };
}

/** What the sound says about the polarity between two takes. */
export interface PolarityBetween {
  /** −1 … 1, see {@link polarityChanged}; null where it can't be told. */
  readonly likeness: number | null;
  /** Null where the likeness is too near 0 to say. */
  readonly seen: 'flipped' | 'as-before' | null;
  /** Kick hits of the later take, and how many of them push the other way than the earlier take as a whole does. */
  readonly hits: number;
  readonly turnedHits: number;
}

/**
 * Whether the overhead was flipped between two takes, from their low end at the kick, and in how many hits it shows.
 *
 * A hit of the later take counts as turned where the real part of its own 30–150 Hz cross term has the other sign than
 * the sum of the earlier take; so where a microphone stands a quarter period off, few may show what all together say.
 * @example
 * const spectra = { before: spectrum, after: spectrum };
 * polarityBetween({ before: facts, after: facts, spectra }).seen // 'as-before'
 */
export function polarityBetween({ before, after, spectra }: PolarityBetweenInput): PolarityBetween {
  const likeness = spectra.before && spectra.after ? polarityChanged(spectra.before, spectra.after) : null;
  const signBefore = lowEndSign(takeSide(before));
  const { kicks } = takeSide(after);
  const turned = kicks.filter(({ figures }) => Math.sign(figures.lowEnergy.cross) * signBefore < 0);
  return { likeness, seen: seenPolarity(likeness), hits: kicks.length, turnedHits: turned.length };
}
