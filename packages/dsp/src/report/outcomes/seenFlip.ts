import { polarityChanged, seenPolarity } from '../../measurements/agreement/polarityChanged';
import type { TakeAndNext } from './outcomeRule';

/** What the pair spectra alone say about the polarity between two takes. @returns null where they can't tell */
export function seenFlip({ spectra }: Pick<TakeAndNext, 'spectra'>): 'flipped' | 'as-before' | null {
  if (!spectra?.before || !spectra.after) return null;
  return seenPolarity(polarityChanged(spectra.before, spectra.after));
}
