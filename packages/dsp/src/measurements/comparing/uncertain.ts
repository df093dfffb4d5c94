import { evenly } from '../evenly';
import { quantile } from '../statistics';
import type { Interval } from './interval';
import { seededRandom } from './seededRandom';

/** A figure over hits, and what it would have been had other hits of the same playing been recorded. */
export interface Uncertain {
  readonly value: number;
  /** The figure of hits drawn anew with replacement; as many for every figure, so that two can be combined. */
  readonly draws: Float64Array;
}

/** The interval hardly moves beyond a thousand. */
const DRAWS = 1000;
/** A long take's interval is drawn from as many of its hits, so it is told no narrower than these allow. */
const MOST_DRAWN = 300;
const OUTSIDE_SHARE = 0.05;

/**
 * A figure of a list of hits with its bootstrap draws.
 *
 * @param hits - at least one
 * @param options.figure - of a list of the same kind, of any length above 0; the hits it gets are in no order
 * @param options.seed - the same hits and seed give the same draws; two figures that are compared need different ones
 * @see B. Efron, "Bootstrap methods: another look at the jackknife", Annals of Statistics 7 (1979) (from memory)
 */
export function uncertain<Hit>(
  hits: readonly Hit[],
  { figure, seed }: { readonly figure: (hits: readonly Hit[]) => number; readonly seed: number },
): Uncertain {
  const drawn = evenly(hits, MOST_DRAWN);
  const random = seededRandom(seed);
  const draws = Float64Array.from({ length: DRAWS }, () =>
    figure(drawn.map(() => drawn[Math.floor(random() * drawn.length)])),
  );
  return { value: figure(hits), draws };
}

/** The quantile of values, drawn anew; many times faster than sorting each draw. */
export function uncertainQuantile(
  values: readonly number[],
  { share, seed }: { readonly share: number; readonly seed: number },
): Uncertain {
  const sorted = Float64Array.from(evenly(values, MOST_DRAWN)).sort();
  const random = seededRandom(seed);
  const counts = new Uint16Array(sorted.length);
  const draws = Float64Array.from({ length: DRAWS }, () => {
    counts.fill(0);
    for (let i = 0; i < sorted.length; i += 1) counts[Math.floor(random() * sorted.length)] += 1;
    return countedQuantile(sorted, counts, share);
  });
  return { value: quantile(values, share) ?? NaN, draws };
}

/** A median over hits. @param values - at least one, finite */
export function uncertainMedian(values: readonly number[], seed: number): Uncertain {
  return uncertainQuantile(values, { share: 0.5, seed });
}

/** Distance between the quartiles; the same seed draws the same hits for both. */
export function uncertainIqr(values: readonly number[], seed: number): Uncertain {
  return minus(
    uncertainQuantile(values, { share: 0.75, seed }),
    uncertainQuantile(values, { share: 0.25, seed }),
  );
}

/** The difference of two figures, draw by draw. */
export function minus(a: Uncertain, b: Uncertain): Uncertain {
  return { value: a.value - b.value, draws: a.draws.map((draw, i) => draw - b.draws[i]) };
}

/** The sum of two figures, draw by draw. */
export function sum(a: Uncertain, b: Uncertain): Uncertain {
  return { value: a.value + b.value, draws: a.draws.map((draw, i) => draw + b.draws[i]) };
}

export function scaled({ value, draws }: Uncertain, factor: number): Uncertain {
  return { value: value * factor, draws: draws.map((draw) => draw * factor) };
}

/** The logarithm of a figure above 0. */
export function logarithm({ value, draws }: Uncertain): Uncertain {
  return { value: Math.log(value), draws: draws.map(Math.log) };
}

/** Where a figure lies with 95 %. */
export function interval95({ draws }: Uncertain): Interval {
  const sorted = Float64Array.from(draws).sort();
  const at = (share: number): number => countedQuantile(sorted, null, share);
  return { low: at(OUTSIDE_SHARE / 2), high: at(1 - OUTSIDE_SHARE / 2) };
}

/** Type 7, as `quantile`, of sorted values each of which counts so many times; all count once without counts. */
function countedQuantile(sorted: Float64Array, counts: Uint16Array | null, share: number): number {
  const position = (sorted.length - 1) * share;
  const below = Math.floor(position);
  const lower = counted(sorted, counts, below);
  const upper = position > below ? counted(sorted, counts, below + 1) : lower;
  return lower + (upper - lower) * (position - below);
}

function counted(sorted: Float64Array, counts: Uint16Array | null, place: number): number {
  if (!counts) return sorted[place];
  let seen = 0;
  for (let i = 0; i < sorted.length; i += 1) {
    seen += counts[i];
    if (seen > place) return sorted[i];
  }
  return sorted[sorted.length - 1];
}
