import type { Interval } from './interval';
import { seeds } from './medianDifference';
import { interval95, logarithm, minus, uncertainMedian, type Uncertain } from './uncertain';

/** A step worth mentioning: a difference in the figure's own unit, or a share of it. */
export type WorthStep =
  { readonly kind: 'difference'; readonly size: number } | { readonly kind: 'share'; readonly size: number };

/** Steps worth mentioning: the first three of docs/measurements.md, 8; what the others rest on is said beside them. */
export const worthSteps = {
  peakDb: { kind: 'difference', size: 1 },
  lowEndDb: { kind: 'difference', size: 0.5 },
  decayS: { kind: 'share', size: 0.1 },
  /** Our choice: a quiet second is told within 0.7 dB, in two takes. */
  noiseDb: { kind: 'difference', size: 2 },
  /** What an arrival is told within in 95 % of takes (docs/measurements.md, 4): 10 cm. */
  arrivalMs: { kind: 'difference', size: 0.3 },
  /** The least difference of early-to-late energy that is heard (ISO 3382-1 Annex A for C80, from memory). */
  earlyToLateDb: { kind: 'difference', size: 1 },
  /** Our choice: as for peaks. */
  levelDb: { kind: 'difference', size: 1 },
} as const satisfies Record<string, WorthStep>;

/** docs/measurements.md, 8: false changes in 20–30 % of pairs with two hits a side, in 2–3 % with eight. */
export const FEWEST_HITS = 6;

/** How a figure moved, surely or not. */
export interface Change {
  /** After minus before; for a share, after over before minus 1. */
  readonly change: number;
  /** Where the change lies with 95 %. */
  readonly interval: Interval;
  /** True only where the interval excludes no change and the change exceeds its step. */
  readonly clear: boolean;
}

/** How a figure changed from one take to another. */
export type TakeChange =
  | (Change & { readonly reason: null })
  | {
      readonly change: null;
      readonly interval: null;
      readonly clear: false;
      readonly reason: 'too-few-hits';
    };

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
  if (Math.min(values.before.length, values.after.length) < FEWEST_HITS) {
    return { change: null, interval: null, clear: false, reason: 'too-few-hits' };
  }
  const figures = {
    before: uncertainMedian(values.before, seeds.before),
    after: uncertainMedian(values.after, seeds.after),
  };
  return { ...changeOf(figures, step), reason: null };
}

/** How a figure with draws moved. @param figures - drawn with different seeds; above 0 where the step is a share */
export function changeOf(
  { before, after }: { readonly before: Uncertain; readonly after: Uncertain },
  step: WorthStep,
): Change {
  const share = step.kind === 'share';
  const moved = share ? minus(logarithm(after), logarithm(before)) : minus(after, before);
  const { low, high } = interval95(moved);
  const back = (value: number): number => (share ? Math.expm1(value) : value);
  // A tenth shorter and a tenth longer are the same step, so shares are compared as logarithms.
  const least = share ? Math.log1p(step.size) : step.size;
  return {
    change: back(moved.value),
    interval: { low: back(low), high: back(high) },
    clear: (low > 0 || high < 0) && Math.abs(moved.value) > least,
  };
}
