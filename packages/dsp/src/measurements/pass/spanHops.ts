import { largestOfSpan, type Spans } from '../spans';
import type { TrackHops } from './trackPass';

export interface SpanHopsOptions {
  readonly samplesPerHop: number;
  /** Which of the spans' filters are the bands; null where nobody listens to one. */
  readonly low: number;
  readonly body: number | null;
  readonly bright: number | null;
}

/** Adds spans up to hops. */
export interface SpanHops {
  /**
   * @param spans - cut at the ends of hops
   * @returns the hops that this block completed; the arrays are used again for the next block
   */
  push(spans: Spans): TrackHops;
}

export function createSpanHops({ samplesPerHop, low, body, bright }: SpanHopsOptions): SpanHops {
  const filters = [low, body, bright].filter((filter) => filter !== null);
  const energies = new Float64Array(filters.length);
  const open = { peak: 0, samples: 0 };
  let rooms = filters.map(() => new Float64Array(0));
  let peaks = new Float64Array(0);
  return {
    push(spans) {
      // No more hops than spans end.
      if (peaks.length < spans.count) {
        peaks = new Float64Array(spans.count);
        rooms = filters.map(() => new Float64Array(spans.count));
      }
      // Locals: a number that is kept elsewhere is written to the heap each time.
      let { peak, samples } = open;
      let count = 0;
      for (let span = 0, from = 0; span < spans.count; from = spans.ends[span], span += 1) {
        samples += spans.ends[span] - from;
        peak = Math.max(peak, largestOfSpan(spans, span));
        for (let f = 0; f < filters.length; f += 1) energies[f] += spans.heard[filters[f]][span];
        if (samples < samplesPerHop) continue;
        for (let f = 0; f < filters.length; f += 1) {
          rooms[f][count] = energies[f] / samplesPerHop;
          energies[f] = 0;
        }
        peaks[count] = peak;
        peak = 0;
        samples = 0;
        count += 1;
      }
      open.peak = peak;
      open.samples = samples;
      const band = (filter: number | null): Float64Array =>
        filter === null ? nothing : rooms[filters.indexOf(filter)].subarray(0, count);
      return { low: band(low), peaks: peaks.subarray(0, count), body: band(body), bright: band(bright) };
    },
  };
}

const nothing = new Float64Array(0);
