import { assertPositive } from '../../assert';
import { median, quantile } from '../statistics';
import { seededRandom } from './seededRandom';

/** Both ends belong to it. */
export interface Interval {
  readonly low: number;
  readonly high: number;
}

export interface MedianDifference {
  /** Median after minus median before. */
  readonly difference: number;
  /** Where the difference lies with 95 %. */
  readonly interval: Interval;
}

export interface MedianDifferenceOptions {
  /** Draws; the interval hardly moves beyond a thousand. */
  readonly draws?: number;
  /** Of the draws: the same figures always give the same interval. */
  readonly seed?: number;
}

const DRAWS = 2000;
const SEED = 1;
const OUTSIDE_SHARE = 0.05;

/**
 * How far the median moved from one set of hits to another, with its bootstrap 95 % interval.
 *
 * Both sets are drawn anew with replacement, and the interval lies between the 2.5 % and 97.5 % of the differences found.
 *
 * @param before - one value a hit, finite
 * @returns null where either set is empty
 * @throws {SignalError} `option` for a number of draws that is not above 0
 * @see B. Efron, "Bootstrap methods: another look at the jackknife", Annals of Statistics 7 (1979) (from memory)
 */
export function medianDifference(
  before: readonly number[],
  after: readonly number[],
  { draws = DRAWS, seed = SEED }: MedianDifferenceOptions = {},
): MedianDifference | null {
  assertPositive(draws, 'draws');
  const [middleBefore, middleAfter] = [median(before), median(after)];
  if (middleBefore === null || middleAfter === null) return null;
  const random = seededRandom(seed);
  const drawnMedian = (values: readonly number[]): number =>
    median(values.map(() => values[Math.floor(random() * values.length)])) ?? NaN;
  const found = Array.from({ length: Math.ceil(draws) }, () => drawnMedian(after) - drawnMedian(before));
  return {
    difference: middleAfter - middleBefore,
    interval: {
      low: quantile(found, OUTSIDE_SHARE / 2) ?? NaN,
      high: quantile(found, 1 - OUTSIDE_SHARE / 2) ?? NaN,
    },
  };
}
