/**
 * Length of one hop. Shorter than any rise of a drum hit that matters here, and short enough for its own rises to be
 * placed; our choice.
 */
export const HOP_MS = 2;

/** @returns the number of samples in one hop, at least 1 */
export function hopSamples(sampleRateHz: number): number {
  return Math.max(1, Math.round((sampleRateHz * HOP_MS) / 1000));
}
