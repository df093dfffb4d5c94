import { median } from '../statistics';

/** Places of the hits that are struck alike, in the order given. */
export interface StrengthMatch {
  readonly before: readonly number[];
  readonly after: readonly number[];
}

/** docs/measurements.md, 8. */
export const WITHIN_DB = 3;

/**
 * Which hits of two takes are struck alike, by their kick-file peaks: those within 3 dB of both takes' medians.
 *
 * Strength moves everything (attack brightness by 14 dB from soft to hard), so only these may be compared. It goes by the
 * level in the file: where the preamp was turned in between, or may have been, strength can't be matched.
 *
 * @param before - kick-file peak of each kick hit, dBFS
 * @example
 * strengthMatch([-9, -8, -20], [-8, -9, -9]).before // [0, 1]
 */
export function strengthMatch(before: readonly number[], after: readonly number[]): StrengthMatch {
  const medians = [median(before), median(after)];
  const alike = (peakDbfs: number): boolean =>
    medians.every((middle) => middle !== null && Math.abs(peakDbfs - middle) <= WITHIN_DB);
  const places = (peaks: readonly number[]): number[] =>
    peaks.flatMap((peakDbfs, place) => (alike(peakDbfs) ? [place] : []));
  return { before: places(before), after: places(after) };
}
