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
  const open = { energies: new Float64Array(filters.length), peak: 0, samples: 0 };
  let rooms = filters.map(() => new Float64Array(0));
  let peaks = new Float64Array(0);
  return {
    push(spans) {
      // No more hops than spans end.
      if (peaks.length < spans.count) {
        peaks = new Float64Array(spans.count);
        rooms = filters.map(() => new Float64Array(spans.count));
      }
      let count = 0;
      for (let span = 0, from = 0; span < spans.count; from = spans.ends[span], span += 1) {
        open.samples += spans.ends[span] - from;
        open.peak = Math.max(open.peak, largestOfSpan(spans, span));
        for (let f = 0; f < filters.length; f += 1) open.energies[f] += spans.heard[filters[f]][span];
        if (open.samples < samplesPerHop) continue;
        for (let f = 0; f < filters.length; f += 1) rooms[f][count] = open.energies[f] / samplesPerHop;
        peaks[count] = open.peak;
        open.energies.fill(0);
        open.peak = 0;
        open.samples = 0;
        count += 1;
      }
      const band = (filter: number | null): Float64Array =>
        filter === null ? nothing : rooms[filters.indexOf(filter)].subarray(0, count);
      return { low: band(low), peaks: peaks.subarray(0, count), body: band(body), bright: band(bright) };
    },
  };
}

const nothing = new Float64Array(0);
