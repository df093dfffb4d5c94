import { createSpanKernel, type BandFilter, type SpanFigures } from '../kernel/spanKernel';
import { createBandEnergy } from './filters/bandEnergy';

/**
 * A block cut into spans, each with its extremes and sums, so that whoever looks for something loud can pass the rest by.
 * Only good until the next block is cut.
 */
export interface Spans extends SpanFigures {
  readonly count: number;
  /** Where each span ends in the block, not included; it begins where the one before ends. */
  readonly ends: Int32Array;
  readonly lows: Float64Array;
  readonly highs: Float64Array;
  readonly sums: Float64Array;
  /** Sums of squares; not finite where the span holds a value that is no number. */
  readonly energies: Float64Array;
  /** Sums of squares of what each of the cutter's filters lets through. */
  readonly heard: readonly Float64Array[];
}

export interface SpanCutter {
  cut(block: Float32Array): Spans;
}

/** @returns the next place after sample `at` where something is counted anew */
export type Border = (at: number) => number;

/** Long enough that a new extreme is a rare branch, short enough that one hit doesn't drag its decay along; for speed. */
const longestSpan = 512;

export function everySamples(count: number): Border {
  return (at) => (Math.floor(at / count) + 1) * count;
}

/**
 * @param borders - no span crosses one of these, so that whole spans can be added up between them
 * @param filters - whose energy is told of each span
 * @param kernel - null for plain loops, which do the same
 */
export function createSpanCutter(
  borders: readonly Border[],
  filters: readonly BandFilter[] = [],
  kernel = filters.length > 0 ? createSpanKernel(filters) : null,
): SpanCutter {
  const spans = { ...emptySpans(0, filters.length), count: 0 };
  const bands = kernel ? [] : filters.map(createBandEnergy);
  const next = borders.map((border) => border(0));
  let position = 0;
  const endAfter = (from: number): number => {
    const at = position + from;
    let nearest = at + longestSpan;
    for (let b = 0; b < borders.length; b += 1) {
      if (next[b] <= at) next[b] = borders[b](at);
      if (next[b] < nearest) nearest = next[b];
    }
    return nearest - position;
  };
  return {
    cut(block) {
      spans.count = 0;
      for (let from = 0; from < block.length;) {
        const to = Math.min(block.length, endAfter(from));
        if (spans.count === spans.ends.length) Object.assign(spans, longer(spans));
        spans.ends[spans.count] = to;
        if (!kernel) {
          gather(spans, block, { from, to });
          bands.forEach((band, index) => {
            spans.heard[index][spans.count] = band.next(block, from, to);
          });
        }
        spans.count += 1;
        from = to;
      }
      kernel?.measure(block, spans.ends, { first: 0, last: spans.count, into: spans });
      position += block.length;
      return spans;
    },
  };
}

/** @returns the largest |x| of a span */
export function largestOfSpan(spans: Spans, index: number): number {
  return Math.max(-spans.lows[index], spans.highs[index]);
}

function gather(spans: Spans, block: Float32Array, { from, to }: { from: number; to: number }): void {
  let low = block[from];
  let high = low;
  let sum = 0;
  let energy = 0;
  for (let i = from; i < to; i += 1) {
    const sample = block[i];
    if (sample < low) low = sample;
    if (sample > high) high = sample;
    sum += sample;
    energy += sample * sample;
  }
  const at = spans.count;
  spans.lows[at] = low;
  spans.highs[at] = high;
  spans.sums[at] = sum;
  spans.energies[at] = energy;
}

function emptySpans(room: number, filters: number): Omit<Spans, 'count'> {
  const [lows, highs, sums, energies, ...heard] = Array.from(
    { length: 4 + filters },
    () => new Float64Array(room),
  );
  return { ends: new Int32Array(room), lows, highs, sums, energies, heard };
}

function longer(spans: Spans): Omit<Spans, 'count'> {
  const grown = emptySpans(2 * spans.ends.length + 256, spans.heard.length);
  grown.ends.set(spans.ends);
  for (const name of ['lows', 'highs', 'sums', 'energies'] as const) grown[name].set(spans[name]);
  spans.heard.forEach((energies, index) => grown.heard[index].set(energies));
  return grown;
}
