import { medianDifference, type Interval } from './medianDifference';

/** A step worth mentioning: a difference in the figure's own unit, or a share of it. */
export type WorthStep =
  { readonly kind: 'difference'; readonly size: number } | { readonly kind: 'share'; readonly size: number };

/** Steps worth mentioning (section 8). */
export const worthSteps = {
  peakDb: { kind: 'difference', size: 1 },
  lowEndDb: { kind: 'difference', size: 0.5 },
  decayS: { kind: 'share', size: 0.1 },
} as const satisfies Record<string, WorthStep>;

export type TakeChangeReason = 'too-few-hits';

/** How a figure changed from one take to another. */
export interface TakeChange {
  /** After minus before; for a share, after over before minus 1. Null with a reason. */
  readonly change: number | null;
  /** Where the change lies with 95 %. */
  readonly interval: Interval | null;
  /** True only where the interval excludes no change and the change exceeds its step. */
  readonly clear: boolean;
  readonly reason: TakeChangeReason | null;
}

/** Section 8: false changes in 20–30 % of pairs with two hits a side, in 2–3 % with eight. */
const FEWEST_HITS = 6;

/**
 * How a figure of single hits changed from one take to another, told as clear only where it surely did, and by enough.
 *
 * @param values - of hits struck alike, see {@link strengthMatch}; above 0 where the step is a share
 * @param step - what is worth mentioning, see {@link worthSteps}
 * @returns null with a reason below six hits a side
 * @example
 * takeChange({ before: [1, 2, 3, 2, 1, 2], after: [5, 6, 7, 6, 5, 6] }, worthSteps.peakDb).change // 4
 */
export function takeChange(
  values: { readonly before: readonly number[]; readonly after: readonly number[] },
  step: WorthStep,
): TakeChange {
  const share = step.kind === 'share';
  const scale = (list: readonly number[]): readonly number[] => (share ? list.map(Math.log) : list);
  if (Math.min(values.before.length, values.after.length) < FEWEST_HITS) return nothing;
  const moved = medianDifference(scale(values.before), scale(values.after));
  if (!moved) return nothing;
  const { difference, interval } = moved;
  const back = (value: number): number => (share ? Math.expm1(value) : value);
  // A tenth shorter and a tenth longer are the same step, so shares are compared as logarithms.
  const least = share ? Math.log1p(step.size) : step.size;
  return {
    change: back(difference),
    interval: { low: back(interval.low), high: back(interval.high) },
    clear: (interval.low > 0 || interval.high < 0) && Math.abs(difference) > least,
    reason: null,
  };
}

const nothing: TakeChange = { change: null, interval: null, clear: false, reason: 'too-few-hits' };
