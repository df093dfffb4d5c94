import type { WavFacts } from '@thudline/dsp';

/** What another program made of the same file. */
export type Reader = 'ffmpeg' | 'sox' | 'ffmpeg, told where the sound lies';

/** The largest difference so far between our samples and another reader's, in blocks. */
export interface SampleComparison {
  /** Interleaved samples from the same place on; both are as long. */
  push(ours: Float32Array, theirs: Float64Array): void;
  result(): { readonly largestLsb: number; readonly isWithin: boolean };
}

/** Half of the smallest relative step of a float32: ours hold no more (IEEE 754, 24 bits of significand). */
const float32Rounding = 2 ** -24;
/** SoX holds every sample as a 32-bit integer. */
const soxStep = 2 ** -31;

/**
 * Compares with one step of the file's own depth, and exactly for float, but for what either side can hold: ours float32,
 * SoX 32-bit integers between −1 and +1, where it cuts the overs of a float file off.
 */
export function createSampleComparison(
  facts: Pick<WavFacts, 'encoding' | 'validBits'>,
  reader: Reader,
): SampleComparison {
  const isFloat = facts.encoding === 'float';
  // Differences of a float file are told in steps of 24 bits, so that the figure can be read.
  const lsb = isFloat ? 2 ** -23 : 2 ** (1 - facts.validBits);
  const least = isFloat ? (reader === 'sox' ? soxStep : 0) : lsb;
  const theirsHold = (value: number): number =>
    reader === 'sox' ? Math.max(-1, Math.min(1 - soxStep, value)) : value;
  let largest = 0;
  let isWithin = true;

  return {
    push(ours, theirs) {
      for (const [i, own] of ours.entries()) {
        const other = theirs[i] ?? NaN;
        const difference = Math.abs(theirsHold(own) - other);
        if (!(difference <= Math.max(least, Math.abs(other) * float32Rounding))) isWithin = false;
        if (difference > largest) largest = difference;
      }
    },
    result: () => ({ largestLsb: largest / lsb, isWithin }),
  };
}
