import { polarityChanged } from '../../measurements/agreement/polarityChanged';
import type { TakeAndNext } from './outcomeRule';

/** How far from 0 the likeness of two pairs must be to say anything; our choice, half way. */
const CLEAR_LIKENESS = 0.5;

/** What the pair spectra alone say about the polarity between two takes. @returns null where they can't tell */
export function seenFlip({ spectra }: Pick<TakeAndNext, 'spectra'>): 'flipped' | 'as-before' | null {
  if (!spectra?.before || !spectra.after) return null;
  const likeness = polarityChanged(spectra.before, spectra.after) ?? 0;
  if (Math.abs(likeness) < CLEAR_LIKENESS) return null;
  return likeness < 0 ? 'flipped' : 'as-before';
}
