import type { Interval } from './interval';
import { interval95, minus, uncertainMedian } from './uncertain';

export interface MedianDifference {
  /** Median after minus median before. */
  readonly difference: number;
  /** Where the difference lies with 95 %. */
  readonly interval: Interval;
}

/** Of the draws: the same figures always give the same interval, and a take drawn against itself isn't drawn alike. */
export const seeds = { before: 1, after: 2 } as const;

/**
 * How far the median moved from one set of hits to another, with its seeded bootstrap 95 % interval.
 *
 * @param before - one value a hit, finite
 * @returns null where either set is empty
 * @see uncertain for how it is drawn
 * @example
 * medianDifference([1, 2, 4, 7, 3, 2], [5, 6, 4, 9, 8, 5]).difference // 3
 */
export function medianDifference(
  before: readonly number[],
  after: readonly number[],
): MedianDifference | null {
  if (before.length === 0 || after.length === 0) return null;
  const moved = minus(uncertainMedian(after, seeds.after), uncertainMedian(before, seeds.before));
  return { difference: moved.value, interval: interval95(moved) };
}
